import { and, asc, eq } from 'drizzle-orm';
import type { SwitchingStage } from '@shared/contracts/switching';
import type { Database } from '../db/open-database';
import { builds, importItems, sweeps, sweepTraces } from '../db/schema';

export type Sweep = typeof sweeps.$inferSelect;
export type NewSweep = typeof sweeps.$inferInsert;

export function findSweepByIdentity(db: Database, productId: number, identity: string): number | undefined {
  return db
    .select({ id: sweeps.id })
    .from(sweeps)
    .where(and(eq(sweeps.productId, productId), eq(sweeps.identity, identity)))
    .get()?.id;
}

/** The first sweep of the product with the very same levels. */
export function findSameReading(db: Database, productId: number, readingHash: string): number | undefined {
  return db
    .select({ id: sweeps.id })
    .from(sweeps)
    .where(and(eq(sweeps.productId, productId), eq(sweeps.readingHash, readingHash)))
    .orderBy(asc(sweeps.id))
    .limit(1)
    .get()?.id;
}

export function insertSweep(db: Database, sweep: NewSweep): number {
  return Number(db.insert(sweeps).values(sweep).run().lastInsertRowid);
}

/** Removes a sweep with its trace; batch items that brought it keep their record without it. */
export function deleteSweep(db: Database, id: number): void {
  db.update(importItems).set({ sweepId: null }).where(eq(importItems.sweepId, id)).run();
  db.delete(sweepTraces).where(eq(sweepTraces.sweepId, id)).run();
  db.delete(sweeps).where(eq(sweeps.id, id)).run();
}

export function updateSwitching(db: Database, buildId: number, switching: SwitchingStage[]): void {
  db.update(builds).set({ switching }).where(eq(builds.id, buildId)).run();
}
