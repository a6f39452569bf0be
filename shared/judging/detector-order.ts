import type { Detector } from '@shared/detectors/detectors';
import { CELL_NOT_MEASURED } from '@shared/limits/cells';
import { centiDbToDb } from '@shared/units/centi-decibels';
import { formatDecibels } from '@shared/units/format-decibels';
import type { GuardHit } from './guard-hit';

/** Two sweeps one after the other may drift; parallel detectors of one sweep keep order within 0.5 dB. Our planning value. */
export const SEPARATE_SWEEPS_TOLERANCE_DB = 2;
/** A few cells out of order are noise or a burst; a tenth of them is a mix-up. Our own definition. */
const LEAST_SHARE = 0.1;
const LEAST_CELLS = 3;

const RANK: Record<Detector, number> = { PK: 0, QP: 1, AV: 2 };

/** The sweep of one detector, by cell. */
export interface DetectorCells {
  readonly detector: Detector;
  /** Worst margin a cell, centi-dB, `CELL_NOT_MEASURED` where there is none. */
  readonly cells: Int16Array;
  /** The limit the margins were taken to at each cell's centre, dBuV; two lines that slope alike leave no error of the slope. */
  readonly limitsDbuv: ArrayLike<number>;
}

export interface OrderViolation {
  readonly higher: Detector;
  readonly lower: Detector;
  /** Cells in which `lower` read above `higher` by more than the tolerance. */
  readonly cells: readonly number[];
  readonly comparedCells: number;
  readonly worstExcessDb: number;
}

function compare(higher: DetectorCells, lower: DetectorCells, toleranceDb: number): OrderViolation {
  const cells: number[] = [];
  let comparedCells = 0;
  let worstExcessDb = 0;
  for (let cell = 0; cell < higher.cells.length; cell++) {
    if (higher.cells[cell] === CELL_NOT_MEASURED || lower.cells[cell] === CELL_NOT_MEASURED) continue;
    comparedCells++;
    const higherDbuv = higher.limitsDbuv[cell] - centiDbToDb(higher.cells[cell]);
    const lowerDbuv = lower.limitsDbuv[cell] - centiDbToDb(lower.cells[cell]);
    const excessDb = lowerDbuv - higherDbuv;
    if (excessDb <= toleranceDb) continue;
    cells.push(cell);
    worstExcessDb = Math.max(worstExcessDb, excessDb);
  }
  return { higher: higher.detector, lower: lower.detector, cells, comparedCells, worstExcessDb };
}

/**
 * Finds cells in which a detector reads more than one that can never read less.
 * Formula: level = limit - margin; PK >= QP >= AV for every signal, so lower - higher <= tolerance.
 * @param sweeps sweeps of one run and line, one a detector, on the same cells
 * @param toleranceDb dB, 0.5 for parallel detectors, 2 for separate sweeps
 * @returns one entry a pair of neighbours in PK, QP, AV (or PK, AV without QP) with at least one cell out of order
 * Throws RangeError on vectors of unlike length or the same detector twice.
 * Source: CISPR 16-1-1 detectors on the same filter: the peak is the largest value of the envelope, the quasi-peak charges
 *   toward it, the average is its mean.
 * Example: swapped QP and AV traces give { higher: 'QP', lower: 'AV' } in every cell where they differ by more than 2 dB.
 */
export function detectorOrderViolations(
  sweeps: readonly DetectorCells[],
  toleranceDb = SEPARATE_SWEEPS_TOLERANCE_DB,
): OrderViolation[] {
  const ordered = [...sweeps].sort((a, b) => RANK[a.detector] - RANK[b.detector]);
  const violations: OrderViolation[] = [];
  for (let i = 1; i < ordered.length; i++) {
    const higher = ordered[i - 1];
    const lower = ordered[i];
    if (higher.detector === lower.detector)
      throw new RangeError(`two ${higher.detector} sweeps cannot be put in order`);
    if (higher.cells.length !== lower.cells.length) throw new RangeError('cell vectors must be equally long');
    const violation = compare(higher, lower, toleranceDb);
    if (violation.cells.length > 0) violations.push(violation);
  }
  return violations;
}

/** The violation as a sign that traces were mixed up, or null where it is only a few cells. */
export function detectorOrderHit(violation: OrderViolation): GuardHit | null {
  const { higher, lower, cells, comparedCells, worstExcessDb } = violation;
  if (cells.length < Math.max(LEAST_CELLS, LEAST_SHARE * comparedCells)) return null;
  const text = `${lower} reads above ${higher} in ${cells.length} of ${comparedCells} cells, by up to ${formatDecibels(worstExcessDb)}: traces may be swapped`;
  return { code: 'detectorOrder', text };
}
