import type { GridDescription } from '@shared/traces/frequency-grid';
import { eq, inArray } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { frequencyGrids, sweeps, sweepTraces } from '../db/schema';

export type StoredTrace = typeof sweepTraces.$inferSelect;

export function findGridId(db: Database, hash: string): number | undefined {
  return db.select({ id: frequencyGrids.id }).from(frequencyGrids).where(eq(frequencyGrids.hash, hash)).get()?.id;
}

export function insertGrid(db: Database, hash: string, grid: GridDescription, frequencies: Buffer): number {
  const row = { hash, ...grid, frequencies };
  return Number(db.insert(frequencyGrids).values(row).run().lastInsertRowid);
}

export function gridFrequencies(db: Database, gridId: number): Buffer | undefined {
  return db
    .select({ frequencies: frequencyGrids.frequencies })
    .from(frequencyGrids)
    .where(eq(frequencyGrids.id, gridId))
    .get()?.frequencies;
}

export function insertTrace(db: Database, trace: StoredTrace): void {
  db.insert(sweepTraces).values(trace).run();
}

/** Traces with the grid each is on, in no order. */
export function listTraces(db: Database, sweepIds: readonly number[]): (StoredTrace & { gridId: number })[] {
  return db
    .select({
      sweepId: sweepTraces.sweepId,
      gridId: sweeps.gridId,
      encoding: sweepTraces.encoding,
      levels: sweepTraces.levels,
    })
    .from(sweepTraces)
    .innerJoin(sweeps, eq(sweeps.id, sweepTraces.sweepId))
    .where(inArray(sweepTraces.sweepId, [...sweepIds]))
    .all();
}
