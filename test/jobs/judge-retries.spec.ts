import { asc, eq } from 'drizzle-orm';
import { judgeJob } from '../../jobs/judge';
import { workOnce } from '../../jobs/worker';
import { builds, jobRuns, products } from '../../server/db/schema';
import { requestTeamJudging } from '../../server/judging/request-judging';
import { buildLaboratory, type Laboratory, measureBuild, runJudging } from '../builders/bench-day';
import { buildPerson } from '../builders/team-builder';
import { createTestContext, type TestContext } from '../support/test-context';

const MINUTE_MS = 60_000;
let context: TestContext;
let laboratory: Laboratory;

beforeEach(() => {
  context = createTestContext();
  laboratory = buildLaboratory(context);
  measureBuild(context, laboratory, 1, { levelsDbuv: [50] });
  limitSetIs('WITHDRAWN_SET');
});
afterEach(() => context.close());

/** With a set this program does not have no build of the product can be judged. */
function limitSetIs(limitSetKey: string): void {
  context.db.update(products).set({ limitSetKey }).run();
}

/** Asks every three minutes, as the clock does, and works on what was asked for. Returns how often a run began. */
async function runsWithin(minutes: number): Promise<number> {
  const before = runCount();
  for (let minute = 0; minute < minutes; minute += 3) {
    await runJudging(context);
    context.clock.advance(3 * MINUTE_MS);
  }
  return runCount() - before;
}

function runCount(): number {
  return context.db.select().from(jobRuns).all().length;
}

function verdictOf(position: number) {
  return context.db.select().from(builds).where(eq(builds.position, position)).orderBy(asc(builds.id)).get()?.verdict;
}

describe('a build that cannot be judged', () => {
  it('is tried three times in a row, then three times an hour', async () => {
    expect(await runsWithin(60)).toBe(3);
    expect(await runsWithin(60)).toBe(3);
    const [run] = context.db.select().from(jobRuns).all();
    expect(run?.errors).toEqual([
      { subject: 'C1 / 1.1', message: 'there is no limit set WITHDRAWN_SET in this program' },
    ]);
  });

  it('is judged within the hour once it can be', async () => {
    await runsWithin(12);
    limitSetIs('CISPR32_B');
    await runsWithin(60);
    expect(verdictOf(1)).toBe('cannotSay');
  });

  it('is tried whenever a person asks, and when the program starts', async () => {
    await runsWithin(12);
    const { actor } = buildPerson(context, { teamId: laboratory.team.id, role: 'engineer' });
    requestTeamJudging(context, actor, laboratory.team.id);
    expect(await workOnce(context, 'worker', [judgeJob])).toBe(true);
    expect(await workOnce(context, 'worker', [judgeJob])).toBe(false);
    judgeJob.request(context, 'start');
    expect(await workOnce(context, 'worker', [judgeJob])).toBe(true);
  });

  it('does not keep another build waiting', async () => {
    await runsWithin(12);
    measureBuild(context, laboratory, 2, { levelsDbuv: [50.2] });
    expect(await runsWithin(3)).toBe(1);
  });

  it('keeps no other product waiting', async () => {
    const other = buildLaboratory(context);
    await runsWithin(12);
    measureBuild(context, other, 1, { levelsDbuv: [50] });
    await runJudging(context);
    const judged = context.db.select().from(builds).where(eq(builds.productId, other.product.id)).get();
    expect(judged?.verdict).toBe('cannotSay');
  });
});
