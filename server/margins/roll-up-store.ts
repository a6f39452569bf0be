import { and, asc, eq, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { buildCells, builds, sweeps } from '../db/schema';

export interface RolledSweep {
  id: number;
  stateId: number;
  line: string;
  detector: string;
  worstMarginDb: number | null;
  worstFrequencyHz: number | null;
  cells: Buffer;
}

export type RollUp = Pick<
  typeof builds.$inferInsert,
  'sweepCount' | 'worstMarginDb' | 'worstFrequencyHz' | 'worstSweepId'
>;

/** Product sweeps of a build, those of one series together. */
export function listRolledSweeps(db: Database, buildId: number): RolledSweep[] {
  return db
    .select({
      id: sweeps.id,
      stateId: sweeps.stateId,
      line: sweeps.line,
      detector: sweeps.detector,
      worstMarginDb: sweeps.worstMarginDb,
      worstFrequencyHz: sweeps.worstFrequencyHz,
      cells: sweeps.cells,
    })
    .from(sweeps)
    .where(and(eq(sweeps.buildId, buildId), eq(sweeps.kind, 'product')))
    .orderBy(asc(sweeps.stateId), asc(sweeps.line), asc(sweeps.detector), asc(sweeps.id))
    .all();
}

/** Writes a build's roll-up and raises its data version. */
export function updateRollUp(db: Database, buildId: number, rollUp: RollUp): void {
  db.update(builds)
    .set({ ...rollUp, dataVersion: sql`${builds.dataVersion} + 1` })
    .where(eq(builds.id, buildId))
    .run();
}

export function upsertBuildCells(db: Database, row: typeof buildCells.$inferInsert): void {
  const { buildId, ...cells } = row;
  db.insert(buildCells)
    .values({ buildId, ...cells })
    .onConflictDoUpdate({ target: buildCells.buildId, set: cells })
    .run();
}

export function deleteBuildCells(db: Database, buildId: number): void {
  db.delete(buildCells).where(eq(buildCells.buildId, buildId)).run();
}
