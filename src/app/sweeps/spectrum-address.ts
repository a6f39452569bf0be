import type { SpectrumView } from '../ui/chart/spectrum-types';
import { FULL_RANGE_HZ } from '../ui/chart/frequency-scale';

export interface SpectrumAddress {
  readonly fromHz?: string;
  readonly toHz?: string;
  readonly pins?: string;
}

/** Zoom and pins that an address asks for; what makes no sense is left out. */
export function viewOfAddress({ fromHz, toHz, pins }: SpectrumAddress): Partial<SpectrumView> {
  const range = { fromHz: Number(fromHz), toHz: Number(toHz) };
  const pinsHz = (pins ?? '')
    .split(',')
    .map(Number)
    .filter((pinHz) => pinHz > 0 && Number.isFinite(pinHz));
  return {
    ...(range.fromHz > 0 && range.toHz > range.fromHz && Number.isFinite(range.toHz) && range),
    ...(pinsHz.length > 0 && { pinsHz }),
  };
}

/** Query parameters that keep a view; the whole range without pins needs none. */
export function addressOfView({ fromHz, toHz, pinsHz }: SpectrumView): Record<keyof SpectrumAddress, string | null> {
  const isWhole = fromHz === FULL_RANGE_HZ.fromHz && toHz === FULL_RANGE_HZ.toHz;
  return {
    fromHz: isWhole ? null : String(fromHz),
    toHz: isWhole ? null : String(toHz),
    pins: pinsHz.length === 0 ? null : pinsHz.join(','),
  };
}
