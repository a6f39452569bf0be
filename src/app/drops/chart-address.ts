import { FULL_RANGE_HZ } from '../ui/chart/frequency-scale';
import type { SpectrumView } from '../ui/chart/spectrum-types';

/** The part of the address that keeps what the chart shows, in Hz. */
export interface ChartAddress {
  from?: string;
  to?: string;
  pins?: string;
}

/** The view an address asks for; nonsense counts as left out. */
export function viewOfAddress({ from, to, pins = '' }: ChartAddress): SpectrumView {
  const fromHz = Number(from);
  const toHz = Number(to);
  const isRange = fromHz >= FULL_RANGE_HZ.fromHz && toHz <= FULL_RANGE_HZ.toHz && toHz > fromHz;
  const pinsHz = pins.split('-').map(Number);
  return { ...(isRange ? { fromHz, toHz } : FULL_RANGE_HZ), pinsHz: pinsHz.filter((pinHz) => pinHz > 0) };
}

/** The address of a view; the whole range and no pins need none. */
export function addressOfView({ fromHz, toHz, pinsHz }: SpectrumView) {
  const isWhole = fromHz === FULL_RANGE_HZ.fromHz && toHz === FULL_RANGE_HZ.toHz;
  return {
    from: isWhole ? null : String(fromHz),
    to: isWhole ? null : String(toHz),
    pins: pinsHz.length === 0 ? null : pinsHz.join('-'),
  };
}
