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
