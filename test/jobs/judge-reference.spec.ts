import { asc, eq } from 'drizzle-orm';
import { builds, verdicts } from '../../server/db/schema';
import { chooseReference } from '../../server/products/choose-reference';
import { findProduct } from '../../server/products/find-product';
import { buildLaboratory, type Laboratory, measureBuild, runJudging } from '../builders/bench-day';
import { buildPerson } from '../builders/team-builder';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let laboratory: Laboratory;

beforeEach(() => {
  context = createTestContext();
  laboratory = buildLaboratory(context);
});
afterEach(() => context.close());

function choose(n: number | null): void {
  const { actor } = buildPerson(context, { teamId: laboratory.team.id, role: 'lead' });
  const found = findProduct(context, actor, laboratory.product.key, undefined, 'references.choose');
  context.clock.advance(1000);
  chooseReference(context, actor, found, { buildId: n === null ? null : idOf(n), reason: 'passed at the test house' });
}

function idOf(n: number): number {
  const build = context.db.select().from(builds).where(eq(builds.position, n)).get();
  if (build === undefined) throw new Error(`there is no build ${n}`);
  return build.id;
}

/** Change of margin in the lowest band, by build. */
function changes(): (number | null)[] {
  const rows = context.db
    .select({ differenceDb: verdicts.differenceDb })
    .from(verdicts)
    .innerJoin(builds, eq(builds.id, verdicts.buildId))
    .where(eq(verdicts.band, '0.15-0.5 MHz'))
    .orderBy(asc(builds.position))
    .all();
  return rows.map(({ differenceDb }) => differenceDb && Math.round(differenceDb * 10) / 10);
}

describe('the reference build', () => {
  beforeEach(async () => {
    for (const [index, levelDbuv] of [50, 50.4, 49.6, 50.2].entries()) {
      measureBuild(context, laboratory, index + 1, { levelsDbuv: [levelDbuv] });
    }
    await runJudging(context);
  });

  it('is the pooled mean of earlier builds until the team chooses one', () => {
    // 50.0 - 50.4; mean(50.0, 50.4) - 49.6; mean(50.0, 50.4, 49.6) - 50.2
    expect(changes()).toEqual([null, -0.4, 0.6, -0.2]);
  });

  it('is used for the builds after it only, and rewrites no verdict before', async () => {
    choose(2);
    await runJudging(context);
    expect(changes()).toEqual([null, -0.4, 0.8, 0.2]);
  });

  it('keeps serving the builds between it and a newer reference', async () => {
    choose(1);
    await runJudging(context);
    expect(changes()).toEqual([null, -0.4, 0.4, -0.2]);
    choose(3);
    await runJudging(context);
    expect(changes()).toEqual([null, -0.4, 0.4, -0.6]);
  });

  it('goes back to the pooled mean when the choice is taken back', async () => {
    choose(2);
    await runJudging(context);
    choose(null);
    await runJudging(context);
    expect(changes()).toEqual([null, -0.4, 0.6, -0.2]);
  });
});
