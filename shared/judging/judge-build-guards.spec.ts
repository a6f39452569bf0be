import { aRun, oneBand, runsOf } from '../../test/builders/judging';
import { judgeBuild } from './judge-build';
import type { RunMargin } from './run-margin';

const judgeOne = (...input: Parameters<typeof oneBand>) => judgeBuild(oneBand(...input))[0];
const lossOf = (overrides: Partial<RunMargin>) =>
  judgeOne({ build: [aRun({ marginDb: 1, buildId: 9, ...overrides })] });

describe('judgeBuild refuses', () => {
  it.each<[string, Partial<RunMargin>]>([
    ['rbwOutOfTolerance', { rbwHz: 10_001 }],
    ['rbwOutOfTolerance', { rbwHz: 7_999 }],
    ['limitDiffers', { limitLineKey: 'CISPR32_A/QP' }],
    ['correctionUnknown', { correction: 'unknown' }],
    ['bandNotCovered', { coveredFraction: 0.9 }],
    ['correctionDiffers', { correction: 'none' }],
  ])('with %s, and raises nothing', (code, overrides) => {
    const judgement = lossOf(overrides);
    expect(judgement).toMatchObject({ verdict: 'cannotSay', differenceDb: null, p: null });
    expect(judgement.reasons.map((reason) => reason.code)).toEqual([code]);
    expect(judgement.settles).toHaveLength(1);
  });

  it.each([8_000, 10_000])('nothing at the edge of the tolerance of the RBW, %d Hz', (rbwHz) => {
    expect(lossOf({ rbwHz }).verdict).toBe('lost');
  });

  it('a trace whose numbers are those of the reference', () => {
    const reference = runsOf([8.3, 7.8, 8.1, 7.6, 8.2]);
    const stale = aRun({ marginDb: 8.2, buildId: 9, readingHash: reference[4].readingHash });
    expect(judgeOne({ reference, history: reference, build: [stale] }).reasons[0].code).toBe('staleTrace');
  });

  it('the stale one of two runs only, and remarks it', () => {
    const reference = runsOf([8.3, 7.8, 8.1, 7.6, 8.2]);
    const stale = aRun({ marginDb: 8.2, buildId: 9, readingHash: reference[4].readingHash });
    const judgement = judgeOne({ reference, history: reference, build: [stale, aRun({ marginDb: 1, buildId: 9 })] });
    expect(judgement).toMatchObject({ verdict: 'lost', buildRuns: 1 });
    expect(judgement.remarks.map(({ code }) => code)).toContain('runsLeftOut');
  });

  it('to count one reading stored twice as two runs', () => {
    const build = [1, 2].map((copy) => aRun({ marginDb: 1, buildId: 9, run: `${copy}`, readingHash: 'same' }));
    expect(judgeOne({ build }).buildRuns).toBe(1);
  });

  it('to count one reading of the reference stored twice as two runs', () => {
    const reference = [1, 2].map((buildId) => aRun({ buildId, readingHash: 'same' }));
    expect(judgeOne({ reference, history: reference }).referenceRuns).toBe(1);
  });

  it('a first build, whose margin is stated all the same', () => {
    const judgement = judgeOne({
      reference: [],
      previous: [],
      history: [],
      build: [aRun({ marginDb: -1, frequencyHz: 156_000 })],
    });
    expect(judgement).toMatchObject({ verdict: 'cannotSay', overLimit: true });
    expect(judgement.worst).toMatchObject({ marginDb: -1, frequencyHz: 156_000 });
    expect(judgement.reasons.map(({ code }) => code)).toEqual(['noReference']);
  });

  it('a first build for its own faults before the missing reference', () => {
    const judgement = judgeOne({ reference: [], previous: [], history: [], build: [aRun({ coveredFraction: 0.4 })] });
    expect(judgement.reasons.map(({ code }) => code)).toEqual(['bandNotCovered']);
  });

  it('a band that was not measured, without a margin', () => {
    expect(judgeOne({ build: [] })).toMatchObject({ verdict: 'cannotSay', worst: null, overLimit: false });
  });

  it('to drop a point over the limit because the rest of its band is missing', () => {
    const build = [aRun({ marginDb: 8, buildId: 9 }), aRun({ marginDb: -2, buildId: 9, coveredFraction: 0.5 })];
    const judgement = judgeOne({ build });
    expect(judgement).toMatchObject({ verdict: 'held', overLimit: true, meanMarginDb: 8 });
    expect(judgement.worst?.marginDb).toBe(-2);
  });
});

describe('judgeBuild and masked points', () => {
  it('calls no loss within 6 dB of the background, and one at 6 dB', () => {
    const levelDbuv = 64.7;
    const near = lossOf({ levelDbuv, backgroundLevelDbuv: levelDbuv - 5.9 });
    expect(near.verdict).toBe('cannotSay');
    expect(near.reasons.map(({ code }) => code)).toEqual(['nearBackground']);
    expect(near.settles).toEqual(['background of today']);
    expect(lossOf({ levelDbuv, backgroundLevelDbuv: levelDbuv - 6 }).verdict).toBe('lost');
  });

  it('calls a loss against a reference in the background: it can only be larger', () => {
    const reference = runsOf([8.3, 7.8, 8.1, 7.6, 8.2], 1, { levelDbuv: 57.7, backgroundLevelDbuv: 55 });
    const judgement = judgeOne({ reference, history: reference, build: [aRun({ marginDb: 1, buildId: 9 })] });
    expect(judgement.verdict).toBe('lost');
    expect(judgement.remarks.map(({ code }) => code)).toContain('referenceMasked');
  });

  it('holds nothing that is hidden in this build', () => {
    expect(judgeOne({ build: [aRun({ marginDb: 8, buildId: 9, backgroundLevelDbuv: 55 })] }).verdict).toBe('cannotSay');
  });

  it('calls a gain into the background: it can only be larger', () => {
    const judgement = judgeOne({ build: [aRun({ marginDb: 16, buildId: 9, backgroundLevelDbuv: 47 })] });
    expect(judgement.verdict).toBe('gained');
    expect(judgement.remarks.map(({ code }) => code)).toContain('buildMasked');
  });

  it('holds nothing that is hidden on both sides', () => {
    const hidden = { levelDbuv: 57.7, backgroundLevelDbuv: 55 };
    const reference = runsOf([8.3, 7.8, 8.1, 7.6, 8.2], 1, hidden);
    expect(judgeOne({ reference, history: reference, build: [aRun({ buildId: 9, ...hidden })] }).verdict).toBe(
      'cannotSay',
    );
  });

  it('does not assess a band whose floor would hide a line at the target margin', () => {
    const judgement = lossOf({ marginDb: 4, floorMarginDb: 8, backgroundLevelDbuv: null });
    expect(judgement.reasons.map(({ code }) => code)).toEqual(['floorTooHigh']);
  });

  it('assesses a line that stands clear of a high floor', () => {
    expect(lossOf({ marginDb: 1, floorMarginDb: 8, backgroundLevelDbuv: null }).verdict).toBe('lost');
  });

  it('takes a high floor far above the background for the product', () => {
    expect(lossOf({ marginDb: 1, floorMarginDb: 3, backgroundLevelDbuv: 20 }).verdict).toBe('lost');
  });

  it('does not assess a first build on a high floor either', () => {
    const build = [aRun({ marginDb: 7, floorMarginDb: 8, backgroundLevelDbuv: null })];
    const judgement = judgeOne({ reference: [], previous: [], history: [], build });
    expect(judgement.reasons.map(({ code }) => code)).toEqual(['noReference', 'floorTooHigh']);
  });
});

describe('judgeBuild remarks', () => {
  it('what differs in the set-up, and lets the verdict stand', () => {
    const judgement = lossOf({
      bench: 'bench-2',
      unit: '0009',
      attenuationDb: 20,
      stepHz: 2_250,
      gridId: 2,
      rbwHz: null,
    });
    expect(judgement.verdict).toBe('lost');
    const codes = judgement.remarks.map(({ code }) => code);
    for (const code of [
      'benchDiffers',
      'unitDiffers',
      'attenuationDiffers',
      'stepDiffers',
      'gridDiffers',
      'rbwNotStated',
    ]) {
      expect(codes).toContain(code);
    }
  });

  it('the scalloping bound of the coarser grid (Gaussian 9 kHz filter, 4.5 kHz step: 1.51 dB)', () => {
    const text = lossOf({ gridId: 2, stepHz: 2_250 }).remarks.find(({ code }) => code === 'gridDiffers')?.text;
    expect(text).toContain('1.5 dB');
  });

  it('a loss that has no background of its day', () => {
    expect(lossOf({ backgroundLevelDbuv: null }).remarks.map(({ code }) => code)).toContain('noBackground');
  });
});
