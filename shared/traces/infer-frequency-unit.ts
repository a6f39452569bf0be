import type { FrequencyUnit } from '../units/frequency-unit';
import { FREQUENCY_EXPONENT, FREQUENCY_UNITS } from '../units/frequency-unit';

/** What sweeps of emissions can span: CISPR bands A to D. */
const LOWEST_HZ = 9_000;
const HIGHEST_HZ = 1_000_000_000;

/**
 * Infers the unit of frequency from the ends of a sweep when only one unit makes sense.
 * @param first first frequency as written
 * @param last last frequency as written
 * @returns the only unit that puts both ends between 9 kHz and 1 GHz, or undefined when none or more than one does
 * Source: range of CISPR 16-1-1 bands A to D; the rule is our own definition.
 * Example: 0.15 to 30 can only be MHz; 0.15 to 0.5 may be MHz or GHz and gives undefined.
 */
export function inferFrequencyUnit(first: number, last: number): FrequencyUnit | undefined {
  const fitting = FREQUENCY_UNITS.filter((unit) => {
    const scale = 10 ** FREQUENCY_EXPONENT[unit];
    return first * scale >= LOWEST_HZ && last * scale <= HIGHEST_HZ;
  });
  return fitting.length === 1 ? fitting[0] : undefined;
}
