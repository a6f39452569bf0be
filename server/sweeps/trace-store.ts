import type { GridDescription } from '@shared/traces/frequency-grid';
import { eq, inArray, sql } from 'drizzle-orm';
import { prepared } from '../db/prepared';
import type { Database } from '../db/open-database';
import { frequencyGrids, sweeps, sweepTraces } from '../db/schema';

export type StoredTrace = typeof sweepTraces.$inferSelect;

const gridByHash = prepared((db) =>
  db
    .select({ id: frequencyGrids.id })
    .from(frequencyGrids)
    .where(eq(frequencyGrids.hash, sql.placeholder('hash')))
    .prepare(),
);

export function findGridId(db: Database, hash: string): number | undefined {
  return gridByHash(db).get({ hash })?.id;
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

const traceInsertion = prepared((db) =>
  db
    .insert(sweepTraces)
    .values({
      sweepId: sql.placeholder('sweepId'),
      encoding: sql.placeholder('encoding'),
      levels: sql.placeholder('levels'),
    })
    .prepare(),
);

export function insertTrace(db: Database, trace: StoredTrace): void {
  traceInsertion(db).run({ ...trace });
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
