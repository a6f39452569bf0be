import { firstIndexAbove, firstIndexAtOrAbove } from './frequency-grid';

/** A closed frequency range on a grid: its points are [firstIndex, endIndex), its runs [firstRun, endRun). */
export interface GridRange {
  readonly fromHz: number;
  readonly toHz: number;
  readonly firstIndex: number;
  readonly endIndex: number;
  readonly firstRun: number;
  readonly endRun: number;
}

export interface GridRanges {
  /** Runs are the stretches of points that belong to the same ranges: run r is [runStarts[r], runStarts[r + 1]). */
  readonly runStarts: Int32Array;
  readonly ranges: GridRange[];
}

/**
 * Cuts a grid into runs at the ends of all ranges, so that one pass over the points serves ranges that overlap.
 * @param frequenciesHz strictly rising frequencies in Hz
 * @param ranges frequency ranges in Hz, both ends included
 * @returns starts of the runs (the last entry is the number of points) and the ranges in the order given
 * Example: points 1, 2, 3, 4 Hz and ranges 1-2, 2-4 Hz give runs starting at 0, 1, 2, 4.
 */
export function placeRanges(
  frequenciesHz: Float64Array,
  ranges: readonly { readonly fromHz: number; readonly toHz: number }[],
): GridRanges {
  const spans = ranges.map(({ fromHz, toHz }) => ({
    fromHz,
    toHz,
    firstIndex: firstIndexAtOrAbove(frequenciesHz, fromHz),
    endIndex: firstIndexAbove(frequenciesHz, toHz),
  }));
  const starts = new Set([0, frequenciesHz.length]);
  for (const { firstIndex, endIndex } of spans) starts.add(firstIndex).add(endIndex);
  const runStarts = Int32Array.from(starts).sort();
  return {
    runStarts,
    ranges: spans.map((span) => ({
      ...span,
      firstRun: runStarts.indexOf(span.firstIndex),
      endRun: runStarts.indexOf(span.endIndex),
    })),
  };
}
