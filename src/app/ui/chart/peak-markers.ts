import type { DecimatedTrace } from '@shared/traces/decimate';
import { fractionAt, FrequencyRange } from './frequency-scale';

const WINDOWS = 12;

/** Places for a trace's markers: its highest point in each of twelve equal stretches of the log axis, as [MHz, dBuV]. */
export function peakMarkers({ frequenciesHz, levels }: DecimatedTrace, range: FrequencyRange): [number, number][] {
  const highest = new Array<number | undefined>(WINDOWS);
  frequenciesHz.forEach((frequencyHz, index) => {
    const fraction = fractionAt(frequencyHz, range);
    if (fraction < 0 || fraction > 1) return;
    const window = Math.min(WINDOWS - 1, Math.floor(fraction * WINDOWS));
    const best = highest[window];
    if (best === undefined || levels[index] > levels[best]) highest[window] = index;
  });
  return highest.filter((index) => index !== undefined).map((index) => [frequenciesHz[index] / 1e6, levels[index]]);
}
