import { formatFrequency } from '@shared/units/format-frequency';
import type { Reason } from './band-judgement';
import type { RunMargin } from './run-margin';

/** RBW of band B at 6 dB, in Hz. Source: CISPR 16-1-1, table of bandwidths, 8 to 10 kHz. */
const RBW_RANGE_HZ = [8_000, 10_000] as const;
/** Share of a band that must have been measured: less could hide the worst point. Our own definition. */
const LEAST_COVERED_FRACTION = 0.98;

/** Why the margin of one sweep cannot be compared with any other, or null. */
export function refuseRun(sweep: RunMargin, limitLineKey: string): Reason | null {
  if (sweep.limitLineKey !== limitLineKey) {
    return { code: 'limitDiffers', text: `the margin was taken to ${sweep.limitLineKey}, not to ${limitLineKey}` };
  }
  if (sweep.rbwHz !== null && (sweep.rbwHz < RBW_RANGE_HZ[0] || sweep.rbwHz > RBW_RANGE_HZ[1])) {
    return { code: 'rbwOutOfTolerance', text: `RBW ${formatFrequency(sweep.rbwHz)} is outside 8 to 10 kHz` };
  }
  if (sweep.correction === 'unknown') {
    return { code: 'correctionUnknown', text: 'it is not stated whether the levels are corrected' };
  }
  if (sweep.coveredFraction < LEAST_COVERED_FRACTION) {
    const percent = Math.floor(sweep.coveredFraction * 100);
    return { code: 'bandNotCovered', text: `the sweep covers ${percent} % of the band` };
  }
  return null;
}

/** Whether a sweep's margin holds by itself: part of a band missing spoils the comparison, not a point over the limit. */
export function hasMargin(sweep: RunMargin, limitLineKey: string): boolean {
  const refusal = refuseRun(sweep, limitLineKey);
  return refusal === null || refusal.code === 'bandNotCovered';
}
