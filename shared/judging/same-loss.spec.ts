import { oneBand } from '../../test/builders/judging';
import type { BandJudgement, JudgedSpread } from './band-judgement';
import { judgeBuild } from './judge-build';
import { isFurtherLoss, isOtherLoss, type PlaceLoss } from './same-loss';

const SECOND = { stage: 'PFC', order: 2 };

/** One series that lost, with 0.7 dB of spread in 30 degrees of freedom unless the case is about it. */
function aLoss(
  meanMarginDb: number,
  buildRuns: number,
  { at = 156_000, harmonic = SECOND }: { at?: number; harmonic?: PlaceLoss['harmonic'] } = {},
  judged: Partial<BandJudgement> = {},
): PlaceLoss {
  const spread: JudgedSpread = { sdDb: 0.7, degreesOfFreedom: 30, source: 'own', text: '' };
  const [judgement] = judgeBuild(oneBand());
  const one: BandJudgement = { ...judgement, verdict: 'lost', reasons: [], meanMarginDb, buildRuns, spread, ...judged };
  return { judgements: [one], frequencyHz: at, harmonic };
}

describe('a further loss', () => {
  // Student t of 30 degrees of freedom: t(0.99) = 2.457 (any table of the distribution).
  // Single runs: 2.457 * 0.7 dB * sqrt 2 = 2.43 dB. Three runs each: 1.40 dB, so that the threshold decides.
  it.each([
    [2.4, 1, false],
    [2.5, 1, true],
    [1.9, 3, false],
    [2.1, 3, true],
  ])('is %d dB less in %d runs of each: %s', (lossDb, runs, isFurther) => {
    expect(isFurtherLoss(aLoss(9 - lossDb, runs), aLoss(9, runs))).toBe(isFurther);
  });

  it('is none where the margin is the same or better', () => {
    expect(isFurtherLoss(aLoss(9, 3), aLoss(9, 3))).toBe(false);
    expect(isFurtherLoss(aLoss(14, 3), aLoss(9, 3))).toBe(false);
  });

  it('is told with the narrower spread: the wider may hold a step between builds', () => {
    const wide = { spread: { sdDb: 4, degreesOfFreedom: 30, source: 'own', text: '' } as const };
    expect(isFurtherLoss(aLoss(5, 3, {}, wide), aLoss(9, 3))).toBe(true);
    expect(isFurtherLoss(aLoss(5, 3), aLoss(9, 3, {}, wide))).toBe(true);
    expect(isFurtherLoss(aLoss(5, 3, {}, wide), aLoss(9, 3, {}, wide))).toBe(false);
  });

  it('shows in a series that held before', () => {
    expect(isFurtherLoss(aLoss(5, 3), aLoss(9, 3, {}, { verdict: 'held' }))).toBe(true);
  });

  it.each<[string, Partial<BandJudgement>]>([
    ['another line', { line: 'N' }],
    ['another detector', { detector: 'AV' }],
    ['another limit line', { limitLineKey: 'CISPR32_A/QP' }],
    ['no measurement', { meanMarginDb: null }],
    ['a bench under suspicion', { reasons: [{ code: 'constantOffset', text: '' }] }],
  ])('cannot be told from %s', (_name, judged) => {
    expect(isFurtherLoss(aLoss(2, 3), aLoss(9, 3, {}, judged))).toBe(false);
  });

  it('is none in a series that did not lose now', () => {
    expect(isFurtherLoss(aLoss(2, 3, {}, { verdict: 'cannotSay' }), aLoss(9, 3))).toBe(false);
  });
});

describe('another loss', () => {
  const third = { at: 234_000, harmonic: { stage: 'PFC', order: 3 } };

  // t(0.95) of 30 degrees of freedom = 1.697: three runs each, 1.697 * 0.7 dB * sqrt(2/3) = 0.97 dB.
  it.each([
    [0.9, false],
    [1.1, true],
  ])('stands at another harmonic and is %d dB larger: %s', (lossDb, isOther) => {
    expect(isOtherLoss(aLoss(9 - lossDb, 3, third), aLoss(9, 3))).toBe(isOther);
  });

  it('is none at the same harmonic, wherever it moved', () => {
    expect(isOtherLoss(aLoss(7.5, 3, { at: 200_000 }), aLoss(9, 3))).toBe(false);
  });

  it('is none within a cell of the margin map, a 24th of a decade, where neighbouring high orders take turns', () => {
    const order30 = { at: 2_340_000, harmonic: { stage: 'PFC', order: 30 } };
    const order31 = { at: 2_418_000, harmonic: { stage: 'PFC', order: 31 } };
    expect(isOtherLoss(aLoss(7.5, 3, order31), aLoss(9, 3, order30))).toBe(false);
  });

  it('is none where a harmonic has no single name', () => {
    expect(isOtherLoss(aLoss(7.5, 3, { at: 234_000, harmonic: null }), aLoss(9, 3))).toBe(false);
    expect(isOtherLoss(aLoss(7.5, 3, third), aLoss(9, 3, { harmonic: null }))).toBe(false);
  });

  it('is told by the stage too', () => {
    const llc = { at: 312_000, harmonic: { stage: 'LLC', order: 2 } };
    expect(isOtherLoss(aLoss(7.5, 3, llc), aLoss(9, 3))).toBe(true);
  });
});
