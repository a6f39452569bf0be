import type { LimitLine } from '../limits/limit-line';
import { limitAt } from '../limits/limit-line';
import type { GridRange } from './grid-ranges';
import { interpolatePeak } from './interpolate-peak';

/** Where a trace comes nearest to its limit. The margin is limit minus level, unrounded; below 0 is over the limit. */
export interface MarginPoint {
  readonly marginDb: number;
  readonly frequencyHz: number;
  readonly levelDbuv: number;
  readonly limitDbuv: number;
  /** Whether the point was placed between grid points. */
  readonly interpolated: boolean;
}

/** The measured point of a run with the least margin, and its place between grid points where that is worse still. */
export interface RunWorst {
  readonly measured: MarginPoint;
  readonly refined: MarginPoint | null;
}

/** What the search needs of a prepared grid. */
interface LimitedGrid {
  readonly frequenciesHz: Float64Array;
  readonly line: LimitLine;
  /** NaN where there is no limit: no comparison picks such a point. */
  readonly limitsDbuv: Float64Array;
  readonly runStarts: Int32Array;
}

/**
 * Finds the worst point of every run in one pass over the levels.
 * Formula: least of limit - level; then, where that point is a local maximum of level, the top of the parabola through it
 * and its neighbours with the limit at the top's frequency.
 * @param levelsDbuv levels in dBuV, one a grid point
 * @param grid frequencies, limits and runs
 * @returns one entry a run, null where no point of it has a limit; the first of equal margins
 */
export function worstOfRuns(levelsDbuv: Float32Array, grid: LimitedGrid): (RunWorst | null)[] {
  const { limitsDbuv, runStarts } = grid;
  const runs: (RunWorst | null)[] = [];
  for (let run = 0; run + 1 < runStarts.length; run++) {
    const end = runStarts[run + 1];
    let leastDb = Infinity;
    let index = -1;
    for (let i = runStarts[run]; i < end; i++) {
      const marginDb = limitsDbuv[i] - levelsDbuv[i];
      if (marginDb < leastDb) {
        leastDb = marginDb;
        index = i;
      }
    }
    runs.push(index < 0 ? null : runWorst(levelsDbuv, grid, index));
  }
  return runs;
}

function runWorst(levelsDbuv: Float32Array, grid: LimitedGrid, index: number): RunWorst {
  const levelDbuv = levelsDbuv[index];
  const limitDbuv = grid.limitsDbuv[index];
  const frequencyHz = grid.frequenciesHz[index];
  const measured = { marginDb: limitDbuv - levelDbuv, frequencyHz, levelDbuv, limitDbuv, interpolated: false };

  const peak = interpolatePeak(grid.frequenciesHz, levelsDbuv, index);
  const peakLimitDbuv = peak && limitAt(grid.line, peak.frequencyHz);
  if (peak === null || peakLimitDbuv === null) return { measured, refined: null };
  const marginDb = peakLimitDbuv - peak.levelDbuv;
  // A rising or stepping limit can make the top look better than what was measured: the measured point then stands.
  if (marginDb >= measured.marginDb) return { measured, refined: null };
  return { measured, refined: { marginDb, ...peak, limitDbuv: peakLimitDbuv, interpolated: true } };
}

/**
 * Worst point of a range from the worst points of its runs.
 * A refined point counts in the range its frequency falls into, which may be the range next to its run; a range without a
 * measured point has none.
 * @param runs worst points of all runs of the grid
 * @param range the range, both ends included
 * @returns the point with the least margin, or null
 */
export function worstInRange(runs: readonly (RunWorst | null)[], range: GridRange): MarginPoint | null {
  let worst: MarginPoint | null = null;
  for (let run = range.firstRun; run < range.endRun; run++) worst = worseOf(worst, runs[run]?.measured);
  if (worst === null) return null;
  for (let run = Math.max(0, range.firstRun - 1); run <= range.endRun && run < runs.length; run++) {
    const refined = runs[run]?.refined;
    if (refined && refined.frequencyHz >= range.fromHz && refined.frequencyHz <= range.toHz) {
      worst = worseOf(worst, refined);
    }
  }
  return worst;
}

/** Worst point of all runs. */
export function worstOfAll(runs: readonly (RunWorst | null)[]): MarginPoint | null {
  let worst: MarginPoint | null = null;
  for (const run of runs) worst = worseOf(worst, run?.refined ?? run?.measured);
  return worst;
}

function worseOf(worst: MarginPoint | null, point: MarginPoint | null | undefined): MarginPoint | null {
  if (!point) return worst;
  return worst === null || point.marginDb < worst.marginDb ? point : worst;
}
