import { and, asc, eq, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { prepared } from '../db/prepared';
import { buildCells, builds, frequencyGrids, sweeps } from '../db/schema';

export interface RolledSweep {
  id: number;
  stateId: number;
  line: string;
  detector: string;
  startHz: number;
  stopHz: number;
  medianStepHz: number;
  isSuperseded: boolean;
  worstMarginDb: number | null;
  worstFrequencyHz: number | null;
  cells: Buffer;
}

export type RollUp = Pick<
  typeof builds.$inferSelect,
  'sweepCount' | 'worstMarginDb' | 'worstFrequencyHz' | 'worstSweepId'
>;

const sweepsOfBuild = prepared((db) =>
  db
    .select({
      id: sweeps.id,
      stateId: sweeps.stateId,
      line: sweeps.line,
      detector: sweeps.detector,
      startHz: frequencyGrids.startHz,
      stopHz: frequencyGrids.stopHz,
      medianStepHz: frequencyGrids.medianStepHz,
      isSuperseded: sweeps.isSuperseded,
      worstMarginDb: sweeps.worstMarginDb,
      worstFrequencyHz: sweeps.worstFrequencyHz,
      cells: sweeps.cells,
    })
    .from(sweeps)
    .innerJoin(frequencyGrids, eq(frequencyGrids.id, sweeps.gridId))
    .where(and(eq(sweeps.buildId, sql.placeholder('buildId')), eq(sweeps.kind, 'product')))
    .orderBy(asc(sweeps.stateId), asc(sweeps.line), asc(sweeps.detector), asc(sweeps.id))
    .prepare(),
);

/** Product sweeps of a build, those of one series together. */
export function listRolledSweeps(db: Database, buildId: number): RolledSweep[] {
  return sweepsOfBuild(db).all({ buildId });
}

/** Notes whether a sweep is superseded. */
export function updateSuperseded(db: Database, sweepId: number, isSuperseded: boolean): void {
  db.update(sweeps).set({ isSuperseded }).where(eq(sweeps.id, sweepId)).run();
}

const rollUpUpdate = prepared((db) =>
  db
    .update(builds)
    .set({
      sweepCount: sql`${sql.placeholder('sweepCount')}`,
      worstMarginDb: sql`${sql.placeholder('worstMarginDb')}`,
      worstFrequencyHz: sql`${sql.placeholder('worstFrequencyHz')}`,
      worstSweepId: sql`${sql.placeholder('worstSweepId')}`,
      dataVersion: sql`${builds.dataVersion} + 1`,
    })
    .where(eq(builds.id, sql.placeholder('buildId')))
    .prepare(),
);

/** Writes a build's roll-up and raises its data version. */
export function updateRollUp(db: Database, buildId: number, rollUp: RollUp): void {
  rollUpUpdate(db).run({ buildId, ...rollUp });
}

const cellsUpsert = prepared((db) =>
  db
    .insert(buildCells)
    .values({
      buildId: sql.placeholder('buildId'),
      series: sql.placeholder('series'),
      cells: sql.placeholder('cells'),
      tile: sql.placeholder('tile'),
    })
    .onConflictDoUpdate({
      target: buildCells.buildId,
      set: { series: sql`excluded.series`, cells: sql`excluded.cells`, tile: sql`excluded.tile` },
    })
    .prepare(),
);

export function upsertBuildCells(db: Database, row: typeof buildCells.$inferInsert): void {
  cellsUpsert(db).run({ ...row });
}

export function deleteBuildCells(db: Database, buildId: number): void {
  db.delete(buildCells).where(eq(buildCells.buildId, buildId)).run();
}
