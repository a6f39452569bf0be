/** Least chance that is written with digits; below it the digits say nothing more. */
const LEAST_WRITTEN = 0.0001;

/** Writes a chance (0 to 1) as people say it: "0.004"; "below 0.0001" where it is smaller than that. */
export function formatChance(chance: number): string {
  return chance < LEAST_WRITTEN ? `below ${LEAST_WRITTEN}` : String(Number(chance.toPrecision(1)));
}
