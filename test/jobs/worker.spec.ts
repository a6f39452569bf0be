import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { eq } from 'drizzle-orm';
import { readConfig } from '../../server/config/read-config';
import { type Context, createContext } from '../../server/context';
import { builds, jobRuns, verdicts } from '../../server/db/schema';
import { migrate, requireCurrentSchema } from '../../server/db/migrate';
import { requestJudging } from '../../server/judging/request-judging';
import { claimRun, LEASE_MS } from '../../server/queue/claim-run';
import { enqueueRun } from '../../server/queue/enqueue-run';
import { HeldRun, RunLostError } from '../../server/queue/held-run';
import { judgeOneBuild } from '../../server/judging/judge-one-build';
import type { Job } from '../../jobs/job';
import { judgeJob } from '../../jobs/judge';
import { startScheduler } from '../../jobs/scheduler';
import { startWorker, workOnce } from '../../jobs/worker';
import { buildLaboratory, dayOf, measureBuild, measureQuietBuilds, runJudging } from '../builders/bench-day';
import { createTestContext, type TestContext } from '../support/test-context';
import { TestClock } from '../support/test-clock';

const JOB = { kind: 'job', name: 'test' } as const;

function runsOf(context: Context) {
  return context.db.select().from(jobRuns).all();
}

describe('a judging run', () => {
  let context: TestContext;
  beforeEach(() => void (context = createTestContext()));
  afterEach(() => context.close());

  it('records how many builds there were and how they were judged', async () => {
    const laboratory = buildLaboratory(context);
    measureQuietBuilds(context, laboratory);
    measureBuild(context, laboratory, 6, { levelsDbuv: [56.1, 55.9] });
    await runJudging(context);
    const [run, ...others] = runsOf(context);
    expect(others).toEqual([]);
    expect(run).toMatchObject({
      status: 'done',
      trigger: 'schedule',
      requestedBy: 'judge',
      total: 6,
      done: 6,
      errors: [],
    });
    expect(run?.counts).toMatchObject({ lost: 1 });
    expect(run?.teamId).toBe(laboratory.team.id);
  });

  it('is not asked for where nothing is to be judged', async () => {
    measureQuietBuilds(context, buildLaboratory(context));
    await runJudging(context);
    await runJudging(context);
    expect(runsOf(context)).toHaveLength(1);
  });

  it('judges the other builds when one cannot be, and compares them with that one as soon as it can', async () => {
    const laboratory = buildLaboratory(context);
    measureQuietBuilds(context, laboratory);
    const { $client } = context.db;
    $client.exec(
      `create trigger no_third before insert on verdicts when new.build_id = 3
       begin select raise(abort, 'the third build cannot be stored'); end`,
    );
    await runJudging(context);
    const [run] = runsOf(context);
    expect(run).toMatchObject({ status: 'done', total: 5, done: 5, counts: { failed: 1 } });
    expect(run?.errors.map(({ subject }) => subject)).toEqual(['C1 / 1.3']);
    expect(referenceRunsOfFifth()).toBe(3);

    $client.exec('drop trigger no_third');
    await runJudging(context);
    expect(runsOf(context).at(-1)).toMatchObject({ total: 3, errors: [] });
    expect(referenceRunsOfFifth()).toBe(4);
  });

  function referenceRunsOfFifth(): number | undefined {
    const rows = context.db.select().from(verdicts).where(eq(verdicts.buildId, 5)).all();
    return rows[0]?.judgement.referenceRuns;
  }

  it('leaves a build stale when data came in while it was judged', () => {
    const laboratory = buildLaboratory(context);
    measureBuild(context, laboratory, 1, { levelsDbuv: [50] });
    let looks = 0;
    const racing: Context = {
      ...context,
      get db() {
        looks += 1;
        // The build and its version are read at the first look, all the rest after it.
        if (looks === 2) measureBuild(context, laboratory, 1, { levelsDbuv: [51], takenAt: dayOf(1) + 5 * 3600_000 });
        return context.db;
      },
    };
    judgeOneBuild(racing, 1);
    expect(context.db.select().from(builds).get()).toMatchObject({ judgedVersion: 1, dataVersion: 2 });
  });

  it('takes in what arrives for its product before it ends', async () => {
    const laboratory = buildLaboratory(context);
    measureBuild(context, laboratory, 1, { levelsDbuv: [50] });
    requestJudging(context, JOB, laboratory.product, 'schedule');
    let isFirst = true;
    const job: Job = {
      ...judgeJob,
      run: async (at, held) => {
        const judging = judgeJob.run(at, held);
        if (isFirst) measureBuild(context, laboratory, 2, { levelsDbuv: [50.2] });
        isFirst = false;
        await judging;
      },
    };
    await workOnce(context, 'worker', [job]);
    expect(runsOf(context)).toHaveLength(1);
    expect(runsOf(context)[0]).toMatchObject({ status: 'done', total: 2, done: 2 });
  });
});

describe('two workers on one database file', () => {
  const clock = new TestClock();
  let dataDir: string;
  let first: Context;
  let second: Context;

  beforeEach(() => {
    dataDir = mkdtempSync(join(tmpdir(), 'strandline-workers-'));
    const config = readConfig({ NODE_ENV: 'test', LOG_LEVEL: 'silent', STRANDLINE_DATA_DIR: dataDir });
    first = createContext(config, 'first', clock.now);
    migrate(first.db);
    second = createContext(config, 'second', clock.now);
    requireCurrentSchema(second.db);
  });
  afterEach(() => {
    first.close();
    second.close();
    rmSync(dataDir, { recursive: true, force: true });
  });

  function waitingRun() {
    const laboratory = buildLaboratory(first);
    measureQuietBuilds(first, laboratory);
    requestJudging(first, JOB, laboratory.product, 'schedule');
    return laboratory;
  }

  it('never hold the same product at once, not even a second run of it', () => {
    const { product } = waitingRun();
    expect(claimRun(first, 'one', ['judge'])).toMatchObject({ claimedBy: 'one', attempts: 1 });
    expect(claimRun(second, 'two', ['judge'])).toBeUndefined();
    requestJudging(second, JOB, product, 'schedule');
    expect(claimRun(second, 'two', ['judge'])).toBeUndefined();
    expect(runsOf(first).map(({ status }) => status)).toEqual(['running', 'waiting']);
  });

  it('share the work of different products', () => {
    waitingRun();
    waitingRun();
    expect(claimRun(first, 'one', ['judge'])?.lockKey).not.toBe(claimRun(second, 'two', ['judge'])?.lockKey);
  });

  it('finish, after the lease, what a killed one began, and lose nothing of it', async () => {
    waitingRun();
    const run = claimRun(first, 'killed', ['judge']);
    const held = run && new HeldRun(first, run, 'killed');
    judgeOneBuild(first, 1);
    held?.advance('cannotSay');

    expect(await workOnce(second, 'two', [judgeJob])).toBe(false);
    clock.advance(LEASE_MS + 1);
    expect(await workOnce(second, 'two', [judgeJob])).toBe(true);

    const [done] = runsOf(second);
    expect(done).toMatchObject({ status: 'done', attempts: 2, claimedBy: 'two', total: 4, done: 4 });
    expect(
      second.db
        .select()
        .from(builds)
        .all()
        .every(({ verdict }) => verdict !== null),
    ).toBe(true);
    expect(() => held?.advance('held')).toThrow(RunLostError);
  });

  it('keep the lease of a long run by reporting progress', async () => {
    waitingRun();
    const run = claimRun(first, 'slow', ['judge']);
    const held = run && new HeldRun(first, run, 'slow');
    clock.advance(LEASE_MS - 1000);
    held?.report();
    clock.advance(LEASE_MS - 1000);
    expect(await workOnce(second, 'two', [judgeJob])).toBe(false);
  });

  it('give up a run that killed three of them', () => {
    waitingRun();
    for (const worker of ['one', 'two', 'three']) {
      expect(claimRun(first, worker, ['judge'])?.claimedBy).toBe(worker);
      clock.advance(LEASE_MS + 1);
    }
    expect(claimRun(second, 'four', ['judge'])).toBeUndefined();
    expect(runsOf(second)[0]).toMatchObject({ status: 'failed', attempts: 3 });
  });
});

describe('the scheduler', () => {
  let context: TestContext;
  beforeEach(() => void (context = createTestContext()));
  afterEach(() => context.close());

  it('asks at its start for what fell due while the process was down', async () => {
    const laboratory = buildLaboratory(context);
    measureQuietBuilds(context, laboratory);
    const stop = startScheduler(context, [judgeJob]);
    stop();
    expect(runsOf(context).map(({ trigger, lockKey }) => [trigger, lockKey])).toEqual([
      ['start', `judge:${laboratory.product.id}`],
    ]);
    expect(await workOnce(context, 'worker', [judgeJob])).toBe(true);
  });

  it('asks for the other jobs when one cannot be asked for', () => {
    const laboratory = buildLaboratory(context);
    measureQuietBuilds(context, laboratory);
    const broken: Job = {
      ...judgeJob,
      request: () => {
        throw new Error('the database is locked');
      },
    };
    startScheduler(context, [broken, judgeJob])();
    expect(runsOf(context)).toHaveLength(1);
  });

  it('asks once however often it starts, as long as the run waits', () => {
    measureQuietBuilds(context, buildLaboratory(context));
    startScheduler(context, [judgeJob])();
    startScheduler(context, [judgeJob])();
    expect(runsOf(context)).toHaveLength(1);
  });
});

describe('a worker whose database is locked for longer than it waits', () => {
  it('goes on when it can', async () => {
    const dataDir = mkdtempSync(join(tmpdir(), 'strandline-worker-'));
    const config = readConfig({ NODE_ENV: 'test', LOG_LEVEL: 'silent', STRANDLINE_DATA_DIR: dataDir });
    const [context, other] = [createContext(config, 'worker'), createContext(config, 'other')];
    const stopping = new AbortController();
    try {
      migrate(context.db);
      context.db.$client.pragma('busy_timeout = 1');
      other.db.$client.exec('begin immediate');
      const done = new Promise<void>((resolve) => {
        const job: Job = { name: 'prune', schedule: [], request: () => undefined, run: () => resolve() };
        void startWorker(context, 'worker', [job], stopping.signal).then(() => context.close());
      });
      other.db.$client.exec('rollback');
      enqueueRun(other, JOB, { job: 'prune', teamId: null, lockKey: 'prune', trigger: 'schedule' });
      await done;
    } finally {
      stopping.abort();
      other.close();
      rmSync(dataDir, { recursive: true, force: true });
    }
  });
});
