import type { Band } from '../limits/bands';
import { CELL_NOT_MEASURED } from '../limits/cells';
import type { LimitLine } from '../limits/limit-line';
import { limitAt } from '../limits/limit-line';
import { marginToCentiDb } from '../units/centi-decibels';
import { coveredFraction } from './covered-fraction';
import { floorLevel } from './floor-level';
import type { GridRange } from './grid-ranges';
import { placeRanges } from './grid-ranges';
import type { MarginPoint } from './worst-points';
import { worstInRange, worstOfAll, worstOfRuns } from './worst-points';

export type { MarginPoint } from './worst-points';

export interface BandMargin {
  /** Key of the band. */
  readonly band: string;
  /** Null when no point of the trace lies in the band under a limit. */
  readonly worst: MarginPoint | null;
  /** Share of the band's width that the grid looked at, 0 to 1, see coveredFraction. */
  readonly coveredFraction: number;
  /** Level between the lines, see floorLevel; null without points. */
  readonly floorDbuv: number | null;
  /** Lowest limit on the band's points minus the floor; null without points under a limit. */
  readonly floorMarginDb: number | null;
}

export interface SweepMargins {
  readonly worst: MarginPoint | null;
  readonly bands: BandMargin[];
  /** Worst margin of every cell in centi-dB, rounded down; CELL_NOT_MEASURED where there is none. */
  readonly cells: Int16Array;
}

interface PreparedBand extends GridRange {
  readonly key: string;
  readonly coveredFraction: number;
  readonly lowestLimitDbuv: number;
}

/** All that depends on grid, limit line, bands and cells but not on the levels; prepared once, used for many sweeps. */
export interface PreparedGrid {
  readonly frequenciesHz: Float64Array;
  readonly line: LimitLine;
  /** Limit at every point in dBuV; NaN where there is none. */
  readonly limitsDbuv: Float64Array;
  readonly runStarts: Int32Array;
  readonly bands: readonly PreparedBand[];
  readonly cells: readonly GridRange[];
}

/**
 * Prepares a frequency grid for the margins of any number of sweeps on it.
 * @param frequenciesHz strictly rising frequencies in Hz
 * @param line limit line
 * @param bands bands, both ends included, may overlap
 * @param cellEdges edges of the cells in Hz, strictly rising; a point on an edge belongs to both cells
 * @returns the prepared grid; it stays good as long as grid, line, bands and cells do
 */
export function prepareGrid(
  frequenciesHz: Float64Array,
  line: LimitLine,
  bands: readonly Band[],
  cellEdges: Float64Array,
): PreparedGrid {
  const limitsDbuv = new Float64Array(frequenciesHz.length);
  for (let i = 0; i < limitsDbuv.length; i++) limitsDbuv[i] = limitAt(line, frequenciesHz[i]) ?? NaN;
  const cells = Array.from(cellEdges.subarray(1), (toHz, i) => ({ fromHz: cellEdges[i], toHz }));
  const { runStarts, ranges } = placeRanges(frequenciesHz, [...bands, ...cells]);
  return {
    frequenciesHz,
    line,
    limitsDbuv,
    runStarts,
    bands: bands.map(({ key, fromHz, toHz }, i) => ({
      ...ranges[i],
      key,
      coveredFraction: coveredFraction(frequenciesHz, fromHz, toHz),
      lowestLimitDbuv: leastOf(limitsDbuv, ranges[i]),
    })),
    cells: ranges.slice(bands.length),
  };
}

/** Least limit of a range; Infinity where it has none. */
function leastOf(limitsDbuv: Float64Array, { firstIndex, endIndex }: GridRange): number {
  let least = Infinity;
  for (let i = firstIndex; i < endIndex; i++) if (limitsDbuv[i] < least) least = limitsDbuv[i];
  return least;
}

/**
 * Margins of one sweep: the worst of all, of every band and of every cell.
 * Formula: margin = limit - level, refined between grid points as in worstOfRuns; a refined point only ever makes a margin
 * worse. Cells are floor(100 * margin).
 * @param levelsDbuv levels in dBuV, one a point of the grid
 * @param prepared the grid, from prepareGrid
 * @returns margins in dB with their places; of equal margins the one at the lowest frequency
 * @throws RangeError when the number of levels is not the number of grid points
 * Source: limits as in limitAt; interpolation and rounding are our own definition.
 * Example: a flat 40 dBuV under class B QP has its worst margin, 16 dB, at 0.5 MHz.
 */
export function sweepMargins(levelsDbuv: Float32Array, prepared: PreparedGrid): SweepMargins {
  if (levelsDbuv.length !== prepared.frequenciesHz.length) {
    throw new RangeError(`${levelsDbuv.length} levels do not fit a grid of ${prepared.frequenciesHz.length} points.`);
  }
  const runs = worstOfRuns(levelsDbuv, prepared);
  const cells = new Int16Array(prepared.cells.length);
  for (let i = 0; i < cells.length; i++) {
    const worst = worstInRange(runs, prepared.cells[i]);
    cells[i] = worst ? marginToCentiDb(worst.marginDb) : CELL_NOT_MEASURED;
  }
  return {
    worst: worstOfAll(runs),
    bands: prepared.bands.map((band) => bandMargin(levelsDbuv, band, worstInRange(runs, band))),
    cells,
  };
}

function bandMargin(levelsDbuv: Float32Array, band: PreparedBand, worst: MarginPoint | null): BandMargin {
  const floorDbuv = floorLevel(levelsDbuv, band.firstIndex, band.endIndex);
  return {
    band: band.key,
    worst,
    coveredFraction: band.coveredFraction,
    floorDbuv,
    floorMarginDb: floorDbuv === null || band.lowestLimitDbuv === Infinity ? null : band.lowestLimitDbuv - floorDbuv,
  };
}
