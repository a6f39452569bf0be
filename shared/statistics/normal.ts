import jStat from 'jstat';

/**
 * Chance that a standard normal variable is at most z.
 * @param z any number
 * @returns probability, 0 to 1
 * Source: normal distribution, ISO 3534-1; evaluated by jstat.
 * Example: normalCdf(1) is 0.8413.
 */
export function normalCdf(z: number): number {
  return jStat.normal.cdf(z, 0, 1);
}

/**
 * The z below which a standard normal variable lies with a given chance.
 * @param p probability, above 0 and below 1
 * @returns z
 * Source: normal distribution, ISO 3534-1; evaluated by jstat.
 * Example: normalQuantile(0.975) is 1.960.
 */
export function normalQuantile(p: number): number {
  return jStat.normal.inv(p, 0, 1);
}
