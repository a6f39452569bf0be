import { median } from 'simple-statistics';
import { normalQuantile } from './normal';

export interface TheilSenSlope {
  readonly slope: number;
  /** Confidence interval of the slope; infinite ends where there are too few points for one. */
  readonly interval: readonly [number, number];
}

/** Var(S) of Kendall's score with ties in y. */
function scoreVariance(y: readonly number[]): number {
  const n = y.length;
  const counts = new Map<number, number>();
  for (const value of y) counts.set(value, (counts.get(value) ?? 0) + 1);
  let ties = 0;
  for (const t of counts.values()) ties += t * (t - 1) * (2 * t + 5);
  return (n * (n - 1) * (2 * n + 5) - ties) / 18;
}

/**
 * A slope that a few outliers cannot move.
 * Formula: the median of (y_j - y_i) / (x_j - x_i) over all pairs with x_j > x_i; interval between the order statistics
 * M1 = (N - C) / 2 and M2 + 1 = (N + C) / 2 + 1 of those N slopes, C = z sqrt(Var(S)).
 * @param x positions, at least two different ones
 * @param y values, as many
 * @param confidence of the interval, above 0 and below 1
 * @returns slope in units of y per unit of x
 * Throws RangeError on unlike lengths or no two different positions.
 * Source: Sen, Journal of the American Statistical Association 63 (1968) 1379-1389; Hollander, Wolfe and Chicken,
 *   Nonparametric Statistical Methods, 9.3 (large-sample interval).
 * Example: x 1 2 3 4 10 12 18 and y 9 15 19 20 45 55 78 give 4.
 */
export function theilSenSlope(x: readonly number[], y: readonly number[], confidence = 0.9): TheilSenSlope {
  if (x.length !== y.length) throw new RangeError(`x and y must be equally long, not ${x.length} and ${y.length}`);
  const slopes: number[] = [];
  for (let j = 1; j < x.length; j++) {
    for (let i = 0; i < j; i++) if (x[i] !== x[j]) slopes.push((y[j] - y[i]) / (x[j] - x[i]));
  }
  if (slopes.length === 0) throw new RangeError('a slope needs at least two different positions');
  slopes.sort((a, b) => a - b);
  const reach = normalQuantile((1 + confidence) / 2) * Math.sqrt(scoreVariance(y));
  const lowRank = Math.round((slopes.length - reach) / 2);
  const highRank = Math.round((slopes.length + reach) / 2) + 1;
  return {
    slope: median(slopes),
    interval: [slopes[lowRank - 1] ?? -Infinity, slopes[highRank - 1] ?? Infinity],
  };
}
