import { RECEIVER_BAND_B } from '../detectors/receiver-bands';
import { firstIndexAtOrAbove } from './frequency-grid';

/** A step up to this share of the frequency counts as measured throughout: sweeps with logarithmic steps. */
const DENSE_STEP_SHARE = 0.02;

/**
 * Share of a frequency range that a grid of points really looked at.
 * A point stands for its own receiver bandwidth (9 kHz). The way to the next point counts as measured throughout when it
 * is no longer than that or than 2 % of the frequency; of a longer one only one bandwidth counts.
 * @param frequenciesHz strictly rising frequencies in Hz
 * @param fromHz start of the range in Hz
 * @param toHz end of the range in Hz, above the start
 * @returns 0 to 1, as a share of the range's width in Hz
 * Source: bandwidth from CISPR 16-1-1 band B; the rule is our own definition: a list of a few final readings must not
 * count as a measured band, a sweep with logarithmic steps must.
 * Example: a 4.5 kHz grid from 150 kHz to 30 MHz covers 0.15-0.5 MHz to 1; ten single readings cover it to 0.26.
 */
export function coveredFraction(frequenciesHz: Float64Array, fromHz: number, toHz: number): number {
  const halfBandwidthHz = RECEIVER_BAND_B.bandwidthHz / 2;
  let coveredHz = 0;
  let coveredToHz = fromHz;
  const lastBelow = Math.max(0, firstIndexAtOrAbove(frequenciesHz, fromHz) - 1);
  for (let i = lastBelow; i < frequenciesHz.length; i++) {
    const frequencyHz = frequenciesHz[i];
    if (frequencyHz - halfBandwidthHz >= toHz) break;
    const isLast = i + 1 === frequenciesHz.length;
    const stepHz = isLast ? Infinity : frequenciesHz[i + 1] - frequencyHz;
    const dense = stepHz <= Math.max(2 * halfBandwidthHz, DENSE_STEP_SHARE * frequencyHz);
    const startHz = Math.max(frequencyHz - halfBandwidthHz, coveredToHz);
    const endHz = Math.min(dense ? frequenciesHz[i + 1] : frequencyHz + halfBandwidthHz, toHz);
    if (endHz <= startHz) continue;
    coveredHz += endHz - startHz;
    coveredToHz = endHz;
  }
  return Math.min(1, coveredHz / (toHz - fromHz));
}
