import type { BandJudgement } from './band-judgement';
import { USABLE_REASONS } from './choose-reference';
import { CALLED_P } from './runs-to-settle';
import { type ChangeTest, testChange } from './test-change';

/** Two worst points closer than a cell of the margin map, a 24th of a decade, are one place. Our own definition. */
const ONE_PLACE_RATIO = 10 ** (1 / 24);

/** A loss of one build in an operating state and band, as far as two builds are compared. */
export interface PlaceLoss {
  /** Of every series of the build there, lost or not. */
  readonly judgements: readonly BandJudgement[];
  /** Worst point the loss is described by, Hz. */
  readonly frequencyHz: number;
  /** The harmonic found there; null where none or more than one fits. */
  readonly harmonic: { readonly stage: string; readonly order: number } | null;
}

/**
 * Tells whether a build lost still more than an earlier one that had lost already.
 *
 * In a series the build lost: mean margin now less mean margin then at or below minus the threshold, with a one-sided p of
 * 0.01 or less. The threshold alone would not do: with 0.7 dB of spread a single run is 2 dB below another once in 46 times
 * where nothing changed (0.7 dB * sqrt 2 = 0.99 dB; Phi(-2.02) = 0.022).
 *
 * @param now the later build
 * @param then the earlier one; series it was not soundly measured in are left out
 * @returns false where no series was measured in both
 * Source: our own definition, the rule of the verdict "lost" applied to two builds.
 * Example: 9.4 dB of margin in two runs then, 4.4 dB in two runs now, threshold 2 dB: true.
 */
export function isFurtherLoss(now: PlaceLoss, then: PlaceLoss): boolean {
  return lostSeries(now, then).some(
    ({ test, thresholdDb }) => test.differenceDb <= -thresholdDb && test.lossP <= CALLED_P,
  );
}

/**
 * Tells whether a loss is another one than an earlier build's in the same band: another harmonic, elsewhere, and larger.
 *
 * Larger: in a series the build lost, the 90 % interval of the change since then lies below 0 dB. Two harmonics of about the same
 * level take turns at being the worst point, which is no news.
 *
 * @param now the later build
 * @param then the earlier one
 * @returns false where either harmonic has no name
 * Source: our own definition.
 * Example: 2nd harmonic at 156 kHz then, 3rd at 234 kHz with 1.5 dB less margin in three runs of each now: true.
 */
export function isOtherLoss(now: PlaceLoss, then: PlaceLoss): boolean {
  if (now.harmonic === null || then.harmonic === null) return false;
  const isOtherHarmonic = now.harmonic.stage !== then.harmonic.stage || now.harmonic.order !== then.harmonic.order;
  const ratio = now.frequencyHz / then.frequencyHz;
  const isElsewhere = Math.max(ratio, 1 / ratio) > ONE_PLACE_RATIO;
  return isOtherHarmonic && isElsewhere && lostSeries(now, then).some(({ test }) => isBelowZero(test));
}

function isBelowZero({ differenceDb, halfWidthDb }: ChangeTest): boolean {
  return differenceDb + halfWidthDb < 0;
}

/** The change since `then` in every series lost now and soundly measured in both. */
function lostSeries(now: PlaceLoss, then: PlaceLoss): { test: ChangeTest; thresholdDb: number }[] {
  return now.judgements.flatMap((one) => {
    const before = then.judgements.find((other) => isSameSeries(one, other) && isSound(other));
    if (one.verdict !== 'lost' || one.spread === null || one.meanMarginDb === null) return [];
    if (before === undefined || before.meanMarginDb === null) return [];
    // The wider of the two may hold a step between the builds it was taken from.
    const spread = before.spread !== null && before.spread.sdDb < one.spread.sdDb ? before.spread : one.spread;
    const test = testChange(one.meanMarginDb - before.meanMarginDb, spread, one.buildRuns, before.buildRuns);
    return [{ test, thresholdDb: one.thresholdDb }];
  });
}

function isSameSeries(one: BandJudgement, other: BandJudgement): boolean {
  return one.line === other.line && one.detector === other.detector && one.limitLineKey === other.limitLineKey;
}

function isSound({ reasons }: BandJudgement): boolean {
  return reasons.every(({ code }) => USABLE_REASONS.includes(code));
}
