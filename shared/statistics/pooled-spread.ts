import { mean, sum } from 'simple-statistics';

export interface PooledSpread {
  /** s_r; null without a group of two. */
  readonly withinSd: number | null;
  /** Sum of (n - 1). */
  readonly degreesOfFreedom: number;
  readonly grandMean: number;
  /** s_L; null with fewer than two groups or without `withinSd`. */
  readonly betweenSd: number | null;
  /** s_R. */
  readonly reproducibilitySd: number | null;
}

/** Sum of squared deviations from the mean of the group. */
function squares(group: readonly number[]): number {
  const centre = mean([...group]);
  return sum(group.map((x) => (x - centre) ** 2));
}

/**
 * Pools the spread within groups of repeats, and the spread between the groups.
 * Formula: s_r^2 = sum SS_i / sum (n_i - 1); s_L^2 = max(0, (s_d^2 - s_r^2) / nbar) with
 * s_d^2 = sum n_i (m_i - m)^2 / (p - 1), nbar = (N - sum n_i^2 / N) / (p - 1); s_R^2 = s_r^2 + s_L^2.
 * @param groups repeats of one thing a group, in one unit (dB here); groups may differ in size, none may be empty
 * @returns standard deviations in the same unit
 * Throws RangeError on no group or an empty one.
 * Source: ISO 5725-2:2019, 7.4 (general mean, repeatability and reproducibility variance).
 * Example: [[1, 3], [2, 4]] gives withinSd 1.414 with 2 degrees of freedom.
 */
export function pooledSpread(groups: readonly (readonly number[])[]): PooledSpread {
  if (groups.length === 0 || groups.some((group) => group.length === 0)) {
    throw new RangeError('a pooled spread takes at least one group, and no group may be empty');
  }
  const total = sum(groups.map((group) => group.length));
  const grandMean = sum(groups.map((group) => sum([...group]))) / total;
  const degreesOfFreedom = total - groups.length;
  const withinVariance = degreesOfFreedom > 0 ? sum(groups.map(squares)) / degreesOfFreedom : null;
  const nothingBetween = { betweenSd: null, reproducibilitySd: null };
  if (withinVariance === null) return { withinSd: null, degreesOfFreedom, grandMean, ...nothingBetween };
  const withinSd = Math.sqrt(withinVariance);
  if (groups.length < 2) return { withinSd, degreesOfFreedom, grandMean, ...nothingBetween };

  const weightedSquares = sum(groups.map((group) => group.length * (mean([...group]) - grandMean) ** 2));
  const sizeOfGroup = (total - sum(groups.map((group) => group.length ** 2)) / total) / (groups.length - 1);
  const betweenVariance = Math.max(0, (weightedSquares / (groups.length - 1) - withinVariance) / sizeOfGroup);
  return {
    withinSd,
    degreesOfFreedom,
    grandMean,
    betweenSd: Math.sqrt(betweenVariance),
    reproducibilitySd: Math.sqrt(withinVariance + betweenVariance),
  };
}
