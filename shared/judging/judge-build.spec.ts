import { aBand, aBuildInput, aRun, aSeries, oneBand, runsOf } from '../../test/builders/judging';
import { judgeBuild } from './judge-build';

const judgeOne = (...input: Parameters<typeof oneBand>) => judgeBuild(oneBand(...input))[0];

describe('judgeBuild', () => {
  it('computes difference, spread and interval as by hand', () => {
    // Reference 8.3 7.8 8.1 7.6 8.2: mean 8.0, sum of squares 0.34 with 4 degrees of freedom. Drawn toward 0.7 dB with 4:
    // s = sqrt((4 * 0.49 + 0.34) / 8) = 0.53619, v = 8; t(0.95, 8) = 1.8595 (NIST table 1.860);
    // h = 1.8595 * 0.53619 * sqrt(1 / 1 + 1 / 5) = 1.0922.
    const judgement = judgeOne({ build: [aRun({ marginDb: 2, buildId: 9 })] });
    expect(judgement.differenceDb).toBeCloseTo(-6, 12);
    expect(judgement.spread?.sdDb).toBeCloseTo(0.53619, 5);
    expect(judgement.spread?.degreesOfFreedom).toBeCloseTo(8, 12);
    expect(judgement.halfWidthDb).toBeCloseTo(1.0922, 3);
    expect(judgement).toMatchObject({ verdict: 'lost', buildRuns: 1, referenceRuns: 5, singleRun: true });
    expect(judgement.interval?.[0]).toBeCloseTo(-6 - 1.0922, 3);
  });

  it('calls a gain and a hold, and shows the change to the previous build beside it', () => {
    expect(judgeOne({ build: [aRun({ marginDb: 14, buildId: 9 })] }).verdict).toBe('gained');
    const held = judgeOne({ build: [aRun({ marginDb: 8.2, buildId: 9 })] });
    expect(held).toMatchObject({ verdict: 'held', reasons: [], settles: [] });
    expect(held.previousDifferenceDb).toBeCloseTo(0, 12);
  });

  it('calls nothing lost below the threshold, however certain', () => {
    const build = runsOf(new Array<number>(8).fill(6.1), 9, { buildId: 9 });
    expect(judgeOne({ build }).verdict).toBe('cannotSay');
  });

  it('cannot say where the spread leaves it open, and says how many runs would settle it', () => {
    const judgement = judgeOne({ build: [aRun({ marginDb: 6.8, buildId: 9 })] });
    expect(judgement.verdict).toBe('cannotSay');
    expect(judgement.reasons[0].code).toBe('withinSpread');
    // d = -1.2 dB; h with one more run t(0.95, 9) * 0.536 * sqrt(1/2 + 1/5) = 0.82, with two t(0.95, 10) * 0.536 * sqrt(1/3 + 1/5) = 0.71.
    expect(judgement.settles).toEqual(['two more runs of this build']);
  });

  it('uses the planning spread where nothing was measured twice, and says so', () => {
    const reference = runsOf([8]);
    const judgement = judgeOne({ reference, history: reference, build: [aRun({ marginDb: 7, buildId: 9 })] });
    expect(judgement.spread).toMatchObject({ sdDb: 0.7, degreesOfFreedom: 4, source: 'planning' });
    expect(judgement.spread?.text).toBe("planning value, not yet this bench's own");
  });

  it('lets a repeat study of the bench join the spread', () => {
    // By hand: (8 * 0.2875 + 40 * 0.09) / 48 = 0.12292.
    const judgement = judgeOne({ spread: { sdDb: 0.3, degreesOfFreedom: 40 } });
    expect(judgement.spread?.sdDb).toBeCloseTo(Math.sqrt(0.12292), 4);
    expect(judgement.spread?.source).toBe('own');
  });

  it('adjusts p over all bands and states: what alone is lost, one of sixty is not', () => {
    const lossy = aSeries({ bands: [aBand({ build: [aRun({ marginDb: 5.6, buildId: 9 })] })] });
    // A reference of one run adds a test and tells nothing about the spread.
    const quiet = Array.from({ length: 59 }, (_, index) => {
      const reference = runsOf([8]);
      return aSeries({ stateId: index + 2, bands: [aBand({ reference, history: reference })] });
    });
    const [alone] = judgeBuild(aBuildInput({ series: [lossy] }));
    const [among] = judgeBuild(aBuildInput({ series: [lossy, ...quiet] }));
    expect(alone).toMatchObject({ verdict: 'lost', adjustedP: alone.p });
    expect(among).toMatchObject({ verdict: 'cannotSay', p: alone.p });
    expect(among.adjustedP).toBeCloseTo(60 * (alone.p ?? 0), 12);
  });

  it('cuts the change in two when the worst point moved: difference = limit change - level change', () => {
    const build = [aRun({ marginDb: 2, frequencyHz: 195_000, limitDbuv: 63.8, buildId: 9 })];
    const { move, differenceDb } = judgeOne({ build });
    expect(move).toMatchObject({ moved: true, fromHz: 156_000, toHz: 195_000 });
    expect(move?.limitChangeDb).toBeCloseTo(-1.9, 10);
    expect((move?.limitChangeDb ?? 0) - (move?.levelChangeDb ?? 0)).toBeCloseTo(differenceDb ?? 0, 10);
  });

  it('takes two worst points within half an RBW for one line', () => {
    const near = judgeOne({ build: [aRun({ marginDb: 2, frequencyHz: 160_400, buildId: 9 })] });
    expect(near.move?.moved).toBe(false);
  });

  it('keeps runs of the same name of two builds apart', () => {
    const reference = runsOf([8.3, 7.8, 8.1, 7.6, 8.2], 1, { run: 'morning' });
    expect(judgeOne({ reference, history: reference }).referenceRuns).toBe(5);
  });

  it('averages the sweeps of one run and counts the run once', () => {
    const build = [6, 8].map((marginDb) => aRun({ marginDb, buildId: 9, run: 'morning' }));
    expect(judgeOne({ build })).toMatchObject({ buildRuns: 1, meanMarginDb: 7 });
  });

  it('states over the limit whatever the verdict', () => {
    const reference = runsOf([-0.5, -0.4, -0.6, -0.5, -0.5]);
    const judgement = judgeOne({ reference, history: reference, build: [aRun({ marginDb: -0.5, buildId: 9 })] });
    expect(judgement).toMatchObject({ verdict: 'held', overLimit: true, underTarget: true });
    const onIt = judgeOne({ reference, history: reference, build: [aRun({ marginDb: 0, buildId: 9 })] });
    expect(onIt).toMatchObject({ overLimit: false, underTarget: true });
  });

  it('gives the chance to meet the limit only to a laboratory that entered its budget (JCGM 106: 2.8 dB at u = 1.7 dB)', () => {
    const build = [aRun({ marginDb: 2.8, buildId: 9 })];
    expect(judgeOne({ build }).pConform).toBeNull();
    const [judgement] = judgeBuild({ ...oneBand({ build }), uncertainty: { labDb: 3.4, cisprDb: 3.4 } });
    expect(judgement.pConform).toBeCloseTo(0.95, 3);
  });

  it('takes a budget above U_cispr off the margin before the limit is compared (CISPR 16-4-2)', () => {
    const input = oneBand({ build: [aRun({ marginDb: 0.5, buildId: 9 })] });
    expect(judgeBuild(input)[0].overLimit).toBe(false);
    expect(judgeBuild({ ...input, uncertainty: { labDb: 4, cisprDb: 3.4 } })[0].overLimit).toBe(true);
  });

  it('stops a loss and a gain, and names the hit, when the bench may have moved', () => {
    const guards = [{ code: 'constantOffset' as const, text: 'the whole curve moved by -10.0 dB' }];
    for (const marginDb of [-2, 18]) {
      const judgement = judgeOne({ build: [aRun({ marginDb, buildId: 9 })], guards });
      expect(judgement.verdict).toBe('cannotSay');
      expect(judgement.reasons).toEqual(guards);
      expect(judgement.settles[0]).toBe('check the bench first');
    }
  });

  it('remarks that a PK sweep clears the AV line as well', () => {
    const build = [aRun({ marginDb: 12, averageLineMarginDb: 2, buildId: 9 })];
    const [judgement] = judgeBuild(aBuildInput({ series: [aSeries({ detector: 'PK', bands: [aBand({ build })] })] }));
    expect(judgement.remarks.map(({ code }) => code)).toContain('clearsAverageLine');
  });

  it('gives the same answer for the same data', () => {
    const input = oneBand();
    expect(judgeBuild(input)).toEqual(judgeBuild(input));
  });

  it('refuses a threshold of 0 dB', () => {
    expect(() => judgeBuild({ ...oneBand(), thresholdDb: 0 })).toThrow(RangeError);
  });
});
