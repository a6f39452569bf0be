import type { LimitLine } from '@shared/limits/limit-line';
import { limitAt } from '@shared/limits/limit-line';
import { firstIndexAbove, firstIndexAtOrAbove } from '@shared/traces/frequency-grid';
import type { SpectrumLimit, SpectrumTrace } from './spectrum-types';

export interface SpectrumReading {
  trace: SpectrumTrace;
  frequencyHz: number;
  levelDbuv: number;
  limitDbuv: number | null;
  marginDb: number | null;
}

/** The limit a trace is held against: its detector's line; PK is held against QP, common practice, no source. */
export function limitFor(trace: SpectrumTrace, limits: readonly SpectrumLimit[]): LimitLine | null {
  const find = (detector: string) => limits.find(({ line }) => line.detector === detector)?.line;
  return find(trace.detector) ?? (trace.detector === 'PK' ? find('QP') : undefined) ?? null;
}

/**
 * Reads a trace where the picture draws one column: its highest point between two frequencies, or the nearest point
 * where the column holds none.
 * @returns null beyond the ends of the trace
 */
export function readTrace(
  trace: SpectrumTrace,
  fromHz: number,
  toHz: number,
  limits: readonly SpectrumLimit[],
): SpectrumReading | null {
  const index = highestIndex(trace, fromHz, toHz);
  if (index === null) return null;
  const frequencyHz = trace.frequenciesHz[index];
  const levelDbuv = trace.levelsDbuv[index];
  const limit = limitFor(trace, limits);
  const limitDbuv = limit && limitAt(limit, frequencyHz);
  return { trace, frequencyHz, levelDbuv, limitDbuv, marginDb: limitDbuv === null ? null : limitDbuv - levelDbuv };
}

function highestIndex({ frequenciesHz, levelsDbuv }: SpectrumTrace, fromHz: number, toHz: number): number | null {
  const count = frequenciesHz.length;
  if (count === 0 || toHz < frequenciesHz[0] || fromHz > frequenciesHz[count - 1]) return null;
  const first = firstIndexAtOrAbove(frequenciesHz, fromHz);
  const end = firstIndexAbove(frequenciesHz, toHz);
  if (first >= end) {
    const middleHz = Math.sqrt(fromHz * toHz);
    const isBelowNearer =
      first > 0 && (first >= count || middleHz - frequenciesHz[first - 1] < frequenciesHz[first] - middleHz);
    return isBelowNearer ? first - 1 : first;
  }
  let highest = first;
  for (let index = first + 1; index < end; index++) if (levelsDbuv[index] > levelsDbuv[highest]) highest = index;
  return highest;
}
