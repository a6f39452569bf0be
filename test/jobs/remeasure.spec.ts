import type { Express } from 'express';
import { and, asc, eq, sql } from 'drizzle-orm';
import { judgeJob } from '../../jobs/judge';
import { remeasureJob } from '../../jobs/remeasure';
import { workOnce } from '../../jobs/worker';
import { createApp } from '../../server/app';
import { buildCells, builds, drops, jobRuns, sweeps, sweepTraces, verdicts } from '../../server/db/schema';
import { buildLaboratory, type Laboratory, measureBuild, runJudging } from '../builders/bench-day';
import { signInAs, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

const RADIO = { name: 'Radio', fromHz: 500e3, toHz: 1.6e6 };
const RADIO_KEY = 'Radio 0.5-1.6 MHz';
let context: TestContext;
let app: Express;
let laboratory: Laboratory;
let lead: Visitor;

beforeEach(async () => {
  context = createTestContext();
  app = createApp(context);
  laboratory = buildLaboratory(context);
  ({ visitor: lead } = await signInAs(context, app, { teamId: laboratory.team.id, role: 'lead' }));
});
afterEach(() => context.close());

const setBands = (bands: object[]) => lead.patch(`/api/teams/${laboratory.team.key}`).send({ bands }).expect(200);
const work = () => workOnce(context, 'worker', [remeasureJob]);
const remeasureRuns = () => context.db.select().from(jobRuns).where(eq(jobRuns.job, 'remeasure')).all();
const storedSweeps = () => context.db.select().from(sweeps).orderBy(asc(sweeps.id)).all();
const cellRows = () => context.db.select().from(buildCells).orderBy(asc(buildCells.buildId)).all();

async function trendIn(band: string) {
  const path = `/api/v1/products/${laboratory.product.key}/trend?band=${encodeURIComponent(band)}`;
  const { body } = await lead.get(path).expect(200);
  return body.points.map(({ worstMarginDb }: { worstMarginDb: number | null }) => worstMarginDb);
}

function verdictsIn(band: string, position: number) {
  const { id = 0 } = context.db.select().from(builds).where(eq(builds.position, position)).get() ?? {};
  const isThere = and(eq(verdicts.buildId, id), eq(verdicts.band, band));
  return context.db.select().from(verdicts).where(isThere).all();
}

/** A line at 1 MHz, where the class B QP limit is 56 dBuV (CISPR 32, table A.10). */
function measureLines(levelsDbuv: readonly number[]): void {
  levelsDbuv.forEach((levelDbuv, index) =>
    measureBuild(context, laboratory, index + 1, { levelsDbuv: [0], shape: { peaks: [[1_000_500, levelDbuv]] } }),
  );
}

describe('a band that is new to a team', () => {
  it('is measured in the builds there are, exactly as an import would', async () => {
    measureLines([40, 41, 43]);
    await setBands([RADIO]);
    expect(await trendIn(RADIO_KEY)).toEqual([null, null, null]);
    await work();
    const [first, second, third] = await trendIn(RADIO_KEY);
    expect(first).toBeCloseTo(16, 4);
    expect(second).toBeCloseTo(15, 4);
    expect(third).toBeCloseTo(13, 4);

    // The same trace once more, imported with the band in force.
    const shape = { peaks: [[1_000_500, 40]], seed: 7 } as const;
    await setBands([]);
    measureBuild(context, laboratory, 4, { levelsDbuv: [0], shape });
    await setBands([RADIO]);
    await work();
    measureBuild(context, laboratory, 5, { levelsDbuv: [0], shape });
    const [remeasured, imported] = storedSweeps().slice(-2);
    expect(remeasured?.bands).toEqual(imported?.bands);
    expect(remeasured?.cells).toEqual(imported?.cells);
    expect(remeasured?.worstMarginDb).toBe(imported?.worstMarginDb);
  });

  it('is judged in them, and taken away again with its verdicts and drops', async () => {
    measureLines([40, 40.3, 39.8, 40.1, 39.7, 46]);
    await runJudging(context);
    await setBands([RADIO]);
    await work();
    await runJudging(context);
    expect(verdictsIn(RADIO_KEY, 6).map(({ verdict }) => verdict)).toEqual(['lost']);
    const isRadio = eq(drops.band, RADIO_KEY);
    expect(context.db.select().from(drops).where(isRadio).all()).toMatchObject([{ state: 'new' }]);

    await setBands([]);
    await work();
    await runJudging(context);
    expect(storedSweeps().flatMap(({ bands }) => bands.map(({ band }) => band))).not.toContain(RADIO_KEY);
    expect(verdictsIn(RADIO_KEY, 6)).toEqual([]);
    expect(context.db.select().from(drops).where(isRadio).all()).toMatchObject([{ state: 'withdrawn' }]);
    const trend = await lead.get(`/api/v1/products/${laboratory.product.key}/trend`).expect(200);
    expect(trend.body.bands).not.toContain(RADIO_KEY);
  });

  it('leaves whole-range margins and the margin map as they are', async () => {
    measureLines([40, 41]);
    const before = { cells: cellRows(), worst: storedSweeps().map(({ worstMarginDb }) => worstMarginDb) };
    await setBands([RADIO]);
    await work();
    expect({ cells: cellRows(), worst: storedSweeps().map(({ worstMarginDb }) => worstMarginDb) }).toEqual(before);
  });

  it('is remarked on where the sweep does not reach it, beside the remarks of the import', async () => {
    const frequenciesHz = Float64Array.from({ length: 1000 }, (_, i) => 2e6 + i * 4_500);
    const shape = { frequenciesHz, peaks: [] };
    const [id = 0] = measureBuild(context, laboratory, 1, { levelsDbuv: [0], shape });
    const uncorrected = { code: 'uncorrected', text: 'levels are uncorrected readings' };
    const old = { code: 'notCovered', text: '0.15-0.5 MHz: not measured' };
    context.db
      .update(sweeps)
      .set({ remarks: [uncorrected, old] })
      .where(eq(sweeps.id, id))
      .run();
    await setBands([RADIO]);
    await work();
    const remarks = storedSweeps()[0]?.remarks ?? [];
    expect(remarks[0]).toEqual(uncorrected);
    expect(remarks.filter(({ text }) => text === old.text)).toHaveLength(1);
    expect(remarks).toContainEqual({ code: 'notCovered', text: `${RADIO_KEY}: not measured` });
  });
});

describe('taking margins again', () => {
  const SWEEPS = 60;
  beforeEach(() => {
    const levelsDbuv = Array.from({ length: SWEEPS / 5 }, () => 0);
    for (const n of [1, 2, 3, 4, 5]) measureBuild(context, laboratory, n, { levelsDbuv });
  });

  const withBand = (key: string) => storedSweeps().filter(({ bands }) => bands.some(({ band }) => band === key)).length;

  function refuseSweepsFrom(id: number): void {
    const refusal = `begin select raise(abort, 'disk full'); end`;
    context.db.$client.exec(`create trigger full before update of bands on sweeps when new.id >= ${id} ${refusal}`);
  }

  it('is one run with its progress, asked for only by a change of the bands', async () => {
    await lead.patch(`/api/teams/${laboratory.team.key}`).send({ thresholdDb: 3, bands: [] }).expect(200);
    expect(remeasureRuns()).toEqual([]);
    await setBands([RADIO]);
    await work();
    expect(remeasureRuns()).toMatchObject([
      { status: 'done', trigger: 'person', total: SWEEPS, done: SWEEPS, counts: { remeasured: SWEEPS }, errors: [] },
    ]);
    const { body } = await lead.get(`/api/teams/${laboratory.team.key}/jobs`).expect(200);
    expect(body[0]).toMatchObject({ job: 'remeasure', status: 'done' });
  });

  it('goes on where a stopped run was', async () => {
    await setBands([RADIO]);
    refuseSweepsFrom(50);
    await work();
    const measured = withBand(RADIO_KEY);
    expect(measured).toBeGreaterThan(0);
    expect(measured).toBeLessThan(SWEEPS);
    // As a worker leaves it that was killed.
    context.db.update(jobRuns).set({ status: 'running', claimedBy: 'killed', leaseUntil: 0, finishedAt: null }).run();

    context.db.run(sql`drop trigger full`);
    expect(await work()).toBe(true);
    expect(withBand(RADIO_KEY)).toBe(SWEEPS);
    expect(remeasureRuns()).toMatchObject([
      { status: 'done', attempts: 2, counts: { unchanged: measured, remeasured: SWEEPS - measured } },
    ]);
  });

  it('loses no change of the bands that comes while it runs', async () => {
    await setBands([RADIO]);
    const wider = { ...RADIO, toHz: 2e6 };
    await workOnce(context, 'worker', [
      {
        ...remeasureJob,
        run: async (at, held) => {
          const running = remeasureJob.run(at, held);
          // One batch is stored, the rest is still to come.
          expect(withBand(RADIO_KEY)).toBeGreaterThan(0);
          await Promise.all([running, setBands([wider])]);
        },
      },
    ]);
    while (await work());
    expect(withBand('Radio 0.5-2 MHz')).toBe(SWEEPS);
    expect(withBand(RADIO_KEY)).toBe(0);
    expect(remeasureRuns().map(({ status }) => status)).toEqual(['done', 'done']);
  });

  it('notes a sweep that cannot be measured and goes on with the others', async () => {
    const [broken] = storedSweeps();
    const isBroken = eq(sweepTraces.sweepId, broken?.id ?? 0);
    context.db
      .update(sweepTraces)
      .set({ levels: Buffer.from('none') })
      .where(isBroken)
      .run();
    await setBands([RADIO]);
    await work();
    expect(withBand(RADIO_KEY)).toBe(SWEEPS - 1);
    expect(remeasureRuns()).toMatchObject([
      { status: 'done', total: SWEEPS, counts: { failed: 1 }, errors: [{ subject: `sweep ${broken?.id}` }] },
    ]);
  });

  it('is asked for again at the start and at night after it failed, and at no other time', async () => {
    await setBands([RADIO]);
    refuseSweepsFrom(1);
    await work();
    expect(remeasureRuns()).toMatchObject([
      { status: 'failed', errors: [{ message: expect.stringContaining('full') }] },
    ]);
    context.db.run(sql`drop trigger full`);
    remeasureJob.request(context, 'start');
    await work();
    expect(withBand(RADIO_KEY)).toBe(SWEEPS);
    remeasureJob.request(context, 'start');
    expect(await work()).toBe(false);
  });

  it('follows a limit set that has a new version in this program', async () => {
    await runJudging(context);
    context.db.update(sweeps).set({ limitSetVersion: 0, worstMarginDb: 1, bands: [] }).run();
    remeasureJob.request(context, 'start');
    await work();
    expect(
      storedSweeps().every(({ limitSetVersion, worstMarginDb, bands }) => {
        return limitSetVersion > 0 && worstMarginDb !== 1 && bands.length === 3;
      }),
    ).toBe(true);
    expect(await workOnce(context, 'worker', [judgeJob])).toBe(false);
    judgeJob.request(context, 'schedule');
    expect(await workOnce(context, 'worker', [judgeJob])).toBe(true);
  });
});
