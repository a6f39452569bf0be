import { mean, sum } from 'simple-statistics';
import type { Spread } from './shrink-spread';

/** With fewer variances than this their scatter tells nothing; the common value then weighs little. Our own definition. */
const LEAST_VARIANCES = 6;
const WEIGHT_UNKNOWN = 4;

/**
 * How strongly the variances of an ensemble speak for each other, as degrees of freedom of their common value.
 * Formula: measured variances over their mean follow F(v, d); d solves c = 2 (v + d - 2) / (v (d - 4)), the squared relative
 * spread of F about its mean, where c is the one observed: d = (4 c v + 2 v - 4) / (c v - 2).
 * @param spreads of the members; those without degrees of freedom are passed over
 * @returns above 4; Infinity where the variances scatter no more than equal ones would; 4 with fewer than 6 of them (one
 *   alone gives Infinity)
 * Source: moments of the F distribution (Johnson, Kotz and Balakrishnan, Continuous Univariate Distributions 2, chapter 27);
 * the use of them after Smyth 2004.
 * Example: equal variances give Infinity.
 */
export function priorDegrees(spreads: readonly Spread[]): number {
  const measured = spreads.filter(({ degreesOfFreedom }) => degreesOfFreedom > 0);
  if (measured.length <= 1) return Infinity;
  if (measured.length < LEAST_VARIANCES) return WEIGHT_UNKNOWN;
  const variances = measured.map(({ sd }) => sd ** 2);
  const centre = mean(variances);
  if (centre === 0) return Infinity;
  const scatter = sum(variances.map((x) => (x / centre - 1) ** 2)) / (measured.length - 1);
  const v = measured.length / sum(measured.map(({ degreesOfFreedom }) => 1 / degreesOfFreedom));
  const excess = scatter * v - 2;
  return excess <= 0 ? Infinity : (4 * scatter * v + Math.max(0, 2 * v - 4)) / excess;
}
