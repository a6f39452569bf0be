/** Detector a limit is written for. */
export type LimitDetector = 'PK' | 'QP' | 'AV';

/** One piece of a limit line: flat, or straight over the logarithm of frequency. Both ends belong to it. */
export interface LimitSegment {
  readonly fromHz: number;
  readonly toHz: number;
  readonly fromDbuv: number;
  readonly toDbuv: number;
}

export interface LimitLine {
  readonly detector: LimitDetector;
  readonly segments: readonly LimitSegment[];
}

/**
 * Limit of one segment at a frequency within it.
 * Formula: L(f) = L1 + (L2 - L1) * log10(f / f1) / log10(f2 / f1).
 */
function segmentLimit(segment: LimitSegment, frequencyHz: number): number {
  if (segment.fromDbuv === segment.toDbuv || frequencyHz === segment.fromHz) return segment.fromDbuv;
  if (frequencyHz === segment.toHz) return segment.toDbuv;
  const share = Math.log(frequencyHz / segment.fromHz) / Math.log(segment.toHz / segment.fromHz);
  return segment.fromDbuv + (segment.toDbuv - segment.fromDbuv) * share;
}

/**
 * The limit that applies at a frequency: the lowest of all segments that hold it.
 * Formula: min over segments with f1 <= f <= f2 of the segment's limit; at a shared edge the lower limit applies.
 * @param line limit line
 * @param frequencyHz frequency in Hz, above 0
 * @returns limit in dBuV, unrounded, or null where the line sets no limit (it is never extended)
 * Source: CISPR 32, mains port tables: "decreases linearly with the logarithm of the frequency", "the lower limit applies at the
 * transition frequencies"; 47 CFR 15.107 "the lower limit applies at the band edges".
 * Example: class B QP at 300 kHz is 60.243 dBuV, at 5 MHz 56 dBuV, at 5.000001 MHz 60 dBuV.
 */
export function limitAt(line: LimitLine, frequencyHz: number): number | null {
  let lowest: number | null = null;
  for (const segment of line.segments) {
    if (frequencyHz < segment.fromHz || frequencyHz > segment.toHz) continue;
    const limitDbuv = segmentLimit(segment, frequencyHz);
    if (lowest === null || limitDbuv < lowest) lowest = limitDbuv;
  }
  return lowest;
}
