import type { SwitchingStage } from './switching-stage';

/** Higher orders lie closer together than their own uncertainty in practice. Our own definition. */
const HIGHEST_ORDER = 200;

export interface HarmonicMatch {
  readonly stage: string;
  readonly order: number;
  readonly expectedHz: number;
  /** Frequency found less the one expected. */
  readonly offsetHz: number;
}

/**
 * All harmonics of the declared switching frequencies that a frequency could be.
 * Formula: |f - n f_s| <= tolerance + n f_s spread / 2, per stage.
 * @param frequencyHz frequency found, Hz, above 0
 * @param switching stages as declared for the build
 * @param toleranceHz uncertainty of the frequency found, Hz, above 0
 * @returns matches, nearest first
 * Throws RangeError on a tolerance of 0 or less.
 * Source: harmonics of a periodic waveform; spreading widens the n-th by n times the excursion of the first.
 * Example: 156.2 kHz with a PFC at 78 kHz is its order 2, 200 Hz off.
 */
export function matchHarmonics(
  frequencyHz: number,
  switching: readonly SwitchingStage[],
  toleranceHz: number,
): HarmonicMatch[] {
  if (!(toleranceHz > 0)) throw new RangeError(`a tolerance must be above 0 Hz, not ${toleranceHz} Hz`);
  const matches: HarmonicMatch[] = [];
  for (const { stage, frequencyHz: switchingHz, spreadPercent } of switching) {
    const nearest = Math.round(frequencyHz / switchingHz);
    for (const order of ordersAround(nearest, frequencyHz, switchingHz, spreadPercent, toleranceHz)) {
      const expectedHz = order * switchingHz;
      matches.push({ stage, order, expectedHz, offsetHz: frequencyHz - expectedHz });
    }
  }
  return matches.sort((a, b) => Math.abs(a.offsetHz) - Math.abs(b.offsetHz));
}

function ordersAround(
  nearest: number,
  frequencyHz: number,
  switchingHz: number,
  spreadPercent: number,
  toleranceHz: number,
): number[] {
  const fits = (order: number) => {
    const reachHz = toleranceHz + (order * switchingHz * spreadPercent) / 200;
    return order >= 1 && order <= HIGHEST_ORDER && Math.abs(frequencyHz - order * switchingHz) <= reachHz;
  };
  const orders: number[] = [];
  for (let order = nearest; fits(order); order--) orders.push(order);
  for (let order = nearest + 1; fits(order); order++) orders.push(order);
  return orders;
}

/**
 * Names the harmonic a frequency is, when only one can be meant.
 * @returns the match, or null where no harmonic or more than one (order or stage) lies within reach; `matchHarmonics` lists them
 * Throws RangeError on a tolerance of 0 or less.
 * Source: our own definition; two that fit equally well are never told apart by guessing.
 * Example: 130 kHz with PFC 65 kHz and LLC 130 kHz is null: order 2 of one, order 1 of the other.
 */
export function nameHarmonic(
  frequencyHz: number,
  switching: readonly SwitchingStage[],
  toleranceHz: number,
): HarmonicMatch | null {
  const matches = matchHarmonics(frequencyHz, switching, toleranceHz);
  return matches.length === 1 ? matches[0] : null;
}
