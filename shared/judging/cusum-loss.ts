import { tabularCusum } from '@shared/statistics/cusum';

/** k: half of the shift to be found, one s_I. Source: Montgomery, chapter 9. */
const SLACK_IN_SD = 0.5;
/** h: one false alarm in 930 builds (one-sided), a shift of one s_I found after 10. Source: Montgomery, chapter 9. */
const DECISION_IN_SD = 5;

export interface BuildMargin {
  readonly buildId: number;
  readonly marginDb: number;
}

export interface CusumLoss {
  /** The first build after the sum last stood at zero. */
  readonly startBuildId: number;
  /** The build at which the sum first passed 5 s_I. */
  readonly signalBuildId: number;
  /** Margin lost against the reference, estimated over the builds from the start to the signal, dB, positive. */
  readonly lossDb: number;
}

/**
 * Finds a loss of margin too small to be seen from build to build.
 * Formula: C_i = max(0, C_(i-1) + (reference - 0.5 s) - m_i), signal at C_i > 5 s; loss = 0.5 s + C / N, N builds since zero.
 * @param series mean margins, dB, in build order, without a judged step in between (a step is a drop of its own)
 * @param referenceMeanDb mean margin of the reference, dB
 * @param sdDb s_I, dB, above 0
 * @returns the loss with the build where it began, or null
 * Throws RangeError on a spread of 0 or less.
 * Source: Page 1954; Montgomery, Introduction to Statistical Quality Control, chapter 9, one-sided with k = 0.5 and h = 5.
 * Example: eight builds 2 s_I under the reference signal at the fourth and begin at the first.
 */
export function cusumLoss(series: readonly BuildMargin[], referenceMeanDb: number, sdDb: number): CusumLoss | null {
  if (!(sdDb > 0)) throw new RangeError(`a spread must be above 0 dB, not ${sdDb} dB`);
  const { lower } = tabularCusum(
    series.map(({ marginDb }) => marginDb),
    referenceMeanDb,
    SLACK_IN_SD * sdDb,
  );
  const signalAt = lower.findIndex((sumDb) => sumDb > DECISION_IN_SD * sdDb);
  if (signalAt < 0) return null;
  const startAt = lower.slice(0, signalAt).lastIndexOf(0) + 1;
  return {
    startBuildId: series[startAt].buildId,
    signalBuildId: series[signalAt].buildId,
    lossDb: SLACK_IN_SD * sdDb + lower[signalAt] / (signalAt - startAt + 1),
  };
}
