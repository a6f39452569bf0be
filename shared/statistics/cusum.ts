export interface Cusum {
  /** Upper and lower sums, in the unit of the data. */
  readonly upper: number[];
  readonly lower: number[];
}

/**
 * The tabular cumulative sums of a series.
 * Formula: C+_i = max(0, C+_(i-1) + x_i - (target + K)); C-_i = max(0, C-_(i-1) + (target - K) - x_i).
 * @param series in order, any unit
 * @param target mean the series is held to
 * @param slack K, half the shift to be found, 0 or more
 * @returns both sums, one value an observation
 * Throws RangeError on a negative slack.
 * Source: Page, Biometrika 41 (1954) 100-115; Montgomery, Introduction to Statistical Quality Control, chapter 9.
 * Example: [9.45, 7.99] at target 10 and slack 0.5 gives lower sums 0.05 and 1.56.
 */
export function tabularCusum(series: readonly number[], target: number, slack: number): Cusum {
  if (!(slack >= 0)) throw new RangeError(`the slack of a CUSUM must be 0 or more, not ${slack}`);
  const upper: number[] = [];
  const lower: number[] = [];
  let up = 0;
  let down = 0;
  for (const x of series) {
    up = Math.max(0, up + x - (target + slack));
    down = Math.max(0, down + (target - slack) - x);
    upper.push(up);
    lower.push(down);
  }
  return { upper, lower };
}
