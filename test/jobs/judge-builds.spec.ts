import { asc, eq } from 'drizzle-orm';
import { auditEntries, builds, dropEvents, drops, outboxMails, sweeps, teams, verdicts } from '../../server/db/schema';
import { markStale } from '../../server/judging/mark-stale';
import {
  buildLaboratory,
  dayOf,
  type Laboratory,
  LINE_HZ,
  measureBuild,
  measureQuietBuilds,
  runJudging,
} from '../builders/bench-day';
import { buildProduct } from '../builders/team-builder';
import { createTestContext, type TestContext } from '../support/test-context';

const BAND = '0.15-0.5 MHz';
let context: TestContext;
let laboratory: Laboratory;

beforeEach(() => {
  context = createTestContext();
  laboratory = buildLaboratory(context);
});
afterEach(() => context.close());

function allDrops() {
  return context.db.select().from(drops).orderBy(asc(drops.id)).all();
}

function events() {
  return context.db.select().from(dropEvents).orderBy(asc(dropEvents.id)).all();
}

/** The judgement of build `n` in a band of line L. */
function judgementOf(n: number, { band = BAND, detector = 'QP' } = {}) {
  const rows = context.db
    .select({ judgement: verdicts.judgement, band: verdicts.band, detector: verdicts.detector })
    .from(verdicts)
    .innerJoin(builds, eq(builds.id, verdicts.buildId))
    .where(eq(builds.position, n))
    .all();
  const row = rows.find((one) => one.band === band && one.detector === detector);
  if (row === undefined) throw new Error(`build ${n} has no verdict in ${band}`);
  return row.judgement;
}

function buildAt(n: number) {
  return context.db.select().from(builds).where(eq(builds.position, n)).get();
}

describe('a loss', () => {
  beforeEach(() => {
    measureQuietBuilds(context, laboratory);
    measureBuild(context, laboratory, 6, { levelsDbuv: [56.1, 55.9] });
  });

  it('is flagged by one run of the job, in its band only, with a sentence and the evidence it rests on', async () => {
    await runJudging(context);

    const [drop, ...others] = allDrops();
    expect(others).toEqual([]);
    // 50.0 dBuV on average before, 56.0 dBuV now; the limit at 159 kHz is 66 - 10 lg-interpolated = 65.52 dBuV.
    expect(drop).toMatchObject({ band: BAND, state: 'new', isOverLimit: false, frequencyHz: LINE_HZ });
    expect(drop?.differenceDb).toBeCloseTo(-6.02, 2);
    expect(drop?.marginDb).toBeCloseTo(9.42, 2);
    expect(drop?.sentence).toBe('Firmware 1.6 lost 6.0 dB on L at 159 kHz (QP). 9.4 dB left to the limit.');
    expect(drop?.evidence).toMatchObject({
      methodVersion: 1,
      limitSetKey: 'CISPR32_B',
      limitSetVersion: 1,
      thresholdDb: 2,
      targetMarginDb: 6,
      referenceKind: 'pooled',
      changes: [{ what: 'Firmware', before: '1.5', now: '1.6' }],
    });
    expect(drop?.evidence.referenceBuilds.map(({ firmware }) => firmware)).toEqual(['1.1', '1.2', '1.3', '1.4', '1.5']);
    expect(drop?.evidence.buildSweepIds).toHaveLength(2);
    expect(drop?.evidence.setUp).toContainEqual({
      what: 'RBW',
      build: '9 kHz',
      reference: '9 kHz',
      isDifferent: false,
    });
    expect(events().map(({ kind, text }) => ({ kind, text }))).toEqual([{ kind: 'raised', text: drop?.sentence }]);
    expect(buildAt(6)).toMatchObject({ verdict: 'lost', judgedAt: context.now() });
  });

  it('changes no row and tells nobody when the same data are judged again', async () => {
    await runJudging(context);
    const stored = () => [
      context.db.select().from(verdicts).all(),
      allDrops(),
      events(),
      context.db.select().from(auditEntries).all(),
      context.db.select().from(outboxMails).all(),
    ];
    const before = stored();

    context.clock.advance(3600_000);
    markStale(context, laboratory.product.id, 1);
    await runJudging(context);

    expect(stored()).toEqual(before);
    expect(buildAt(6)?.judgedAt).toBe(context.now());
  });

  it('is withdrawn when new runs contradict it, and raised again when others confirm it', async () => {
    await runJudging(context);
    const at = dayOf(6) + 3600_000 * 5;
    const contradicting = measureBuild(context, laboratory, 6, { levelsDbuv: [50, 50.2, 49.9, 50.1], takenAt: at });
    await runJudging(context);
    expect(allDrops()[0]?.state).toBe('withdrawn');
    expect(events().at(-1)).toMatchObject({ kind: 'withdrawn', actorKind: 'job', actorName: 'judge' });
    expect(events().at(-1)?.text).toMatch(/^The data no longer support it: L QP cannot say \(-2\.1 dB\): /);

    for (const id of contradicting)
      context.db.update(sweeps).set({ kind: 'checkSource' }).where(eq(sweeps.id, id)).run();
    markStale(context, laboratory.product.id, 6);
    await runJudging(context);
    expect(allDrops()).toHaveLength(1);
    expect(allDrops()[0]?.state).toBe('new');
    expect(events().map(({ kind }) => kind)).toEqual(['raised', 'withdrawn', 'raised']);
  });

  it('takes on the evidence of a further run with one dated line', async () => {
    await runJudging(context);
    context.clock.advance(3600_000);
    measureBuild(context, laboratory, 6, { levelsDbuv: [56.6], takenAt: dayOf(6) + 3600_000 * 5 });
    await runJudging(context);
    const [drop] = allDrops();
    expect(drop).toMatchObject({ state: 'new', updatedAt: context.now() });
    expect(drop?.evidence.buildSweepIds).toHaveLength(3);
    expect(events().at(-1)).toMatchObject({ kind: 'evidence', at: context.now() });
    expect(events().at(-1)?.text).toMatch(/^Judged again \(3 sweeps of this build, were 2\): -6\.2 dB, was -6\.0 dB\./);
  });

  it('says in its history that another threshold judged it', async () => {
    await runJudging(context);
    context.db.update(teams).set({ thresholdDb: 3 }).run();
    markStale(context, laboratory.product.id, 1);
    await runJudging(context);
    expect(events().at(-1)?.kind).toBe('evidence');
    expect(events().at(-1)?.text).toMatch(/^Judged again \(threshold in dB 3, was 2\): -6\.0 dB, was -6\.0 dB\./);
  });

  it('keeps a decision made on it when the data change, and says so in its history once', async () => {
    await runJudging(context);
    context.db.update(drops).set({ state: 'accepted' }).run();
    measureBuild(context, laboratory, 6, { levelsDbuv: [50, 50.2, 49.9, 50.1], takenAt: dayOf(6) + 3600_000 * 5 });
    await runJudging(context);
    markStale(context, laboratory.product.id, 6);
    await runJudging(context);
    expect(allDrops()[0]?.state).toBe('accepted');
    expect(events().map(({ kind }) => kind)).toEqual(['raised', 'withdrawn']);
  });

  it('shows in both lines and is one drop with two witnesses', async () => {
    for (let n = 1; n <= 6; n++) {
      measureBuild(context, laboratory, n, {
        levelsDbuv: n === 6 ? [57, 57.2] : [51 + 0.1 * n],
        tags: { line: 'N' },
      });
    }
    await runJudging(context);
    expect(allDrops()).toHaveLength(1);
    const witnesses = allDrops()[0]?.evidence.witnesses.map(({ line, detector }) => `${line} ${detector}`);
    expect(witnesses).toEqual(['N QP', 'L QP']);
  });

  it('goes with its build when the sweeps are removed', async () => {
    await runJudging(context);
    const build = buildAt(6);
    context.db
      .update(sweeps)
      .set({ kind: 'checkSource' })
      .where(eq(sweeps.buildId, build?.id ?? 0))
      .run();
    context.db
      .update(builds)
      .set({ sweepCount: 0, dataVersion: 99 })
      .where(eq(builds.id, build?.id ?? 0))
      .run();
    await runJudging(context);
    expect(buildAt(6)).toMatchObject({ verdict: null, judgedAt: null, judgedVersion: 99 });
    expect(allDrops()[0]?.state).toBe('withdrawn');
    expect(events().at(-1)?.text).toBe('The data no longer support it: this build is no longer measured there.');
  });
});

describe('what cannot be said', () => {
  it('is everything about a first build: there is no reference', async () => {
    measureBuild(context, laboratory, 1, { levelsDbuv: [50] });
    await runJudging(context);
    expect(buildAt(1)?.verdict).toBe('cannotSay');
    expect(judgementOf(1).reasons.map(({ code }) => code)).toEqual(['noReference']);
  });

  it('marks a single run as single', async () => {
    measureQuietBuilds(context, laboratory);
    await runJudging(context);
    const judgement = judgementOf(5);
    expect(judgement).toMatchObject({ singleRun: true, buildRuns: 1 });
    expect(judgement.remarks.map(({ code }) => code)).toContain('singleRun');
  });

  it('is a loss of 10 dB all over the range: a limiter, not the product. Check the bench first', async () => {
    measureQuietBuilds(context, laboratory);
    measureBuild(context, laboratory, 6, { levelsDbuv: [60, 60.2], shape: { floorDbuv: 22 } });
    await runJudging(context);
    const judgement = judgementOf(6);
    expect(judgement.verdict).toBe('cannotSay');
    expect(judgement.reasons.map(({ code }) => code)).toContain('constantOffset');
    expect(judgement.settles[0]).toBe('check the bench first');
    expect(allDrops()).toEqual([]);
  });

  it('is a trace with the numbers of an earlier one', async () => {
    const frozen = { seed: 4711 };
    measureBuild(context, laboratory, 1, { levelsDbuv: [50], shape: frozen });
    measureBuild(context, laboratory, 2, { levelsDbuv: [50], shape: frozen });
    await runJudging(context);
    expect(judgementOf(2)).toMatchObject({ verdict: 'cannotSay', differenceDb: null });
    expect(judgementOf(2).reasons.map(({ code }) => code)).toEqual(['staleTrace']);
  });

  it('is a PK reading after QP ones: they are different series', async () => {
    measureQuietBuilds(context, laboratory);
    measureBuild(context, laboratory, 6, { levelsDbuv: [56, 56.1], tags: { detector: 'PK' } });
    await runJudging(context);
    expect(judgementOf(6, { detector: 'PK' }).reasons.map(({ code }) => code)).toEqual(['noReference']);
    expect(allDrops()).toEqual([]);
  });

  it('is a rise that the background of the day shows as well', async () => {
    measureQuietBuilds(context, laboratory);
    measureBuild(context, laboratory, 6, { levelsDbuv: [56, 56.2] });
    measureBuild(context, laboratory, 6, {
      levelsDbuv: [53],
      takenAt: dayOf(6) + 3 * 3600_000,
      tags: { kind: 'background' },
    });
    await runJudging(context);
    expect(judgementOf(6).verdict).toBe('cannotSay');
    expect(judgementOf(6).reasons.map(({ code }) => code)).toEqual(['nearBackground']);
  });

  it('is a build whose QP and AV traces were swapped', async () => {
    for (let n = 1; n <= 5; n++) {
      measureBuild(context, laboratory, n, { levelsDbuv: [50 + 0.1 * n] });
      measureBuild(context, laboratory, n, {
        levelsDbuv: [40 + 0.1 * n],
        shape: { floorDbuv: 2 },
        tags: { detector: 'AV' },
      });
    }
    measureBuild(context, laboratory, 6, { levelsDbuv: [40], shape: { floorDbuv: 2 } });
    measureBuild(context, laboratory, 6, { levelsDbuv: [50], tags: { detector: 'AV' } });
    await runJudging(context);
    for (const detector of ['QP', 'AV']) {
      expect(judgementOf(6, { detector }).verdict).toBe('cannotSay');
      expect(judgementOf(6, { detector }).reasons.map(({ code }) => code)).toContain('detectorOrder');
    }
  });

  it('is a loss that another product on the same bench and day had too, whichever was judged first', async () => {
    const other = { ...laboratory, product: buildProduct(context, laboratory.team.id, { name: 'Lamp driver' }) };
    measureQuietBuilds(context, laboratory);
    measureBuild(context, laboratory, 6, { levelsDbuv: [56.1, 55.9] });
    await runJudging(context);
    expect(allDrops().map(({ state }) => state)).toEqual(['new']);

    measureQuietBuilds(context, other);
    measureBuild(context, other, 6, { levelsDbuv: [55.8, 56.3] });
    await runJudging(context);
    await runJudging(context);

    expect(allDrops().map(({ state }) => state)).toEqual(['withdrawn']);
    const reasons = judgementOf(6).reasons;
    expect(reasons.map(({ code }) => code)).toEqual(['sameDayShift']);
    expect(
      context.db
        .select()
        .from(builds)
        .all()
        .every((one) => one.dataVersion <= one.judgedVersion),
    ).toBe(true);
  });
});
