import { CELL_COUNT, CELL_NOT_MEASURED } from '@shared/limits/cells';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import type { CellSeries } from '../db/schema/build-cells';
import {
  deleteBuildCells,
  listRolledSweeps,
  type RolledSweep,
  updateRollUp,
  updateSuperseded,
  upsertBuildCells,
} from './roll-up-store';

/**
 * Rewrites what is kept of a build's product sweeps: their number, the worst point and the margin map's row, and raises
 * the data version, so that the job judges the build again. Background and check source sweeps do not count.
 */
export function rollUpBuild(context: Context, buildId: number): void {
  withTransaction(context.db, () => {
    const sweeps = markSuperseded(context, listRolledSweeps(context.db, buildId));
    const worst = worstOf(sweeps.filter(({ isSuperseded }) => !isSuperseded));
    updateRollUp(context.db, buildId, {
      sweepCount: sweeps.length,
      worstMarginDb: worst?.worstMarginDb ?? null,
      worstFrequencyHz: worst?.worstFrequencyHz ?? null,
      worstSweepId: worst?.id ?? null,
    });
    if (sweeps.length === 0) deleteBuildCells(context.db, buildId);
    else upsertBuildCells(context.db, { buildId, ...rollUpCells(sweeps) });
  });
}

/**
 * Marks the PK sweeps that a QP sweep of the same state and line over the same range decides instead of. A PK reading is
 * held against the QP line because it can only overstate (common practice, no source).
 */
function markSuperseded(context: Context, sweeps: readonly RolledSweep[]): RolledSweep[] {
  return sweeps.map((sweep) => {
    const isSuperseded = sweep.detector === 'PK' && sweeps.some((other) => decidesInstead(other, sweep));
    if (isSuperseded !== sweep.isSuperseded) updateSuperseded(context.db, sweep.id, isSuperseded);
    return { ...sweep, isSuperseded };
  });
}

/** Half the 9 kHz bandwidth, the coarsest step of a scan. Source: CISPR 16-2-1. */
const SCAN_STEP_HZ = 4500;

/** A QP list of single frequencies decides nothing between them, so it must be a scan. */
function decidesInstead(other: RolledSweep, peak: RolledSweep): boolean {
  const isSamePlace = other.stateId === peak.stateId && other.line === peak.line;
  const isSameRange = other.startHz <= peak.startHz && other.stopHz >= peak.stopHz;
  const isScan = other.medianStepHz <= Math.max(peak.medianStepHz, SCAN_STEP_HZ);
  return other.detector === 'QP' && isSamePlace && isSameRange && isScan;
}

/** The sweep with the least margin; of equal ones the first. */
function worstOf(sweeps: readonly RolledSweep[]): RolledSweep | undefined {
  let worst: RolledSweep | undefined;
  for (const sweep of sweeps) {
    if (sweep.worstMarginDb === null) continue;
    if (worst === undefined || sweep.worstMarginDb < (worst.worstMarginDb ?? Infinity)) worst = sweep;
  }
  return worst;
}

/** Least margin of every cell: over the sweeps that count, and over those of each series, which the sweeps come ordered by. */
function rollUpCells(sweeps: readonly RolledSweep[]): { series: CellSeries[]; cells: Buffer; tile: Buffer } {
  const series: CellSeries[] = [];
  const rows: Int16Array[] = [];
  const cells = emptyCells();
  for (const { stateId, line, detector, isSuperseded, cells: sweepCells } of sweeps) {
    const last = series.at(-1);
    if (last === undefined || last.stateId !== stateId || last.line !== line || last.detector !== detector) {
      series.push({ stateId, line, detector, isSuperseded });
      rows.push(emptyCells());
    }
    const own = series[series.length - 1];
    own.isSuperseded &&= isSuperseded;
    lower(rows[rows.length - 1], sweepCells);
    if (!isSuperseded) lower(cells, sweepCells);
  }
  return { series, cells: asBuffer(cells), tile: Buffer.concat(rows.map(asBuffer)) };
}

function emptyCells(): Int16Array {
  return new Int16Array(CELL_COUNT).fill(CELL_NOT_MEASURED);
}

function lower(least: Int16Array, sweepCells: Buffer): void {
  for (let cell = 0; cell < CELL_COUNT; cell++) {
    const centiDb = sweepCells.readInt16LE(cell * 2);
    if (centiDb === CELL_NOT_MEASURED) continue;
    const standing = least[cell] ?? CELL_NOT_MEASURED;
    if (standing === CELL_NOT_MEASURED || centiDb < standing) least[cell] = centiDb;
  }
}

function asBuffer({ buffer, byteOffset, byteLength }: Int16Array): Buffer {
  return Buffer.from(buffer, byteOffset, byteLength);
}
