import jStat from 'jstat';

function requireDegrees(degreesOfFreedom: number): void {
  if (!(degreesOfFreedom > 0)) throw new RangeError(`degrees of freedom must be above 0, not ${degreesOfFreedom}`);
}

/**
 * Chance that a Student t variable is at most t.
 * @param t any finite number
 * @param degreesOfFreedom above 0, fractions allowed
 * @returns probability, 0 to 1
 * Throws RangeError on degrees of freedom of 0 or less.
 * Source: Student t distribution, ISO 3534-1; evaluated by jstat (incomplete beta function).
 * Example: studentTCdf(-2.132, 4) is 0.0500.
 */
export function studentTCdf(t: number, degreesOfFreedom: number): number {
  requireDegrees(degreesOfFreedom);
  return jStat.studentt.cdf(t, degreesOfFreedom);
}

/**
 * The t below which a Student t variable lies with a given chance.
 * @param p probability, above 0 and below 1
 * @param degreesOfFreedom above 0, fractions allowed
 * @returns t
 * Throws RangeError outside those ranges.
 * Source: Student t distribution, ISO 3534-1; evaluated by jstat.
 * Example: studentTQuantile(0.95, 4) is 2.132.
 */
export function studentTQuantile(p: number, degreesOfFreedom: number): number {
  requireDegrees(degreesOfFreedom);
  if (!(p > 0 && p < 1)) throw new RangeError(`a probability must lie between 0 and 1, not ${p}`);
  return jStat.studentt.inv(p, degreesOfFreedom);
}
