import { formatFrequency } from '@shared/units/format-frequency';

/** Ends of the range of conducted emissions that charts open with, Hz. */
export const FULL_RANGE_HZ = { fromHz: 150_000, toHz: 30_000_000 } as const;

/** The trade's ticks of a log frequency axis, Hz. */
const TRADE_TICKS_HZ = [9e3, 20e3, 30e3, 50e3, 100e3, 150e3, 200e3, 300e3, 500e3, 1e6, 2e6, 3e6, 5e6, 10e6, 20e6, 30e6];

export interface FrequencyRange {
  fromHz: number;
  toHz: number;
}

/** Frequency at a fraction (0 to 1) of a log axis. */
export function frequencyAt(fraction: number, { fromHz, toHz }: FrequencyRange): number {
  return fromHz * (toHz / fromHz) ** fraction;
}

/** Fraction of a log axis at which a frequency lies; outside 0 to 1 when off the axis. */
export function fractionAt(frequencyHz: number, { fromHz, toHz }: FrequencyRange): number {
  return Math.log(frequencyHz / fromHz) / Math.log(toHz / fromHz);
}

/** Ticks of the axis: the trade's where enough of them are in view, else round steps, Hz. */
export function frequencyTicksHz({ fromHz, toHz }: FrequencyRange): number[] {
  const trade = TRADE_TICKS_HZ.filter((tickHz) => tickHz >= fromHz * 0.999 && tickHz <= toHz * 1.001);
  if (trade.length >= 4) return trade;
  const stepHz = roundStep((toHz - fromHz) / 6);
  const first = Math.ceil(fromHz / stepHz);
  const last = Math.floor(toHz / stepHz);
  return Array.from({ length: last - first + 1 }, (_, i) => (first + i) * stepHz);
}

/** Tick text in the trade's short form: 150k, 1M, 1.25M; when zoomed far in, enough digits to tell ticks apart. */
export function tickLabel(frequencyHz: number): string {
  const [divisor, letter] = frequencyHz < 999_999 ? [1e3, 'k'] : [1e6, 'M'];
  return `${Number((frequencyHz / divisor).toPrecision(6))}${letter}`;
}

export function rangeText({ fromHz, toHz }: FrequencyRange): string {
  return `${formatFrequency(fromHz)} to ${formatFrequency(toHz)}`;
}

/** The next of 1, 2 or 5 times a power of ten. */
function roundStep(least: number): number {
  const decade = 10 ** Math.floor(Math.log10(least));
  const factor = [1, 2, 5, 10].find((candidate) => candidate * decade >= least) ?? 10;
  return factor * decade;
}
