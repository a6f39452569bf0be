import type { SwitchingStage } from '@shared/contracts/switching';
import { and, asc, eq, getTableColumns, type Placeholder, sql } from 'drizzle-orm';
import { prepared } from '../db/prepared';
import type { Database } from '../db/open-database';
import { builds, importItems, sweeps, sweepTraces } from '../db/schema';

export type Sweep = typeof sweeps.$inferSelect;
/** Whether it is superseded is the roll-up's to say (server/margins/roll-up-build.ts). */
export type NewSweep = Omit<Sweep, 'id' | 'isSuperseded'>;

const byIdentity = prepared((db) =>
  db
    .select({ id: sweeps.id })
    .from(sweeps)
    .where(and(eq(sweeps.productId, sql.placeholder('productId')), eq(sweeps.identity, sql.placeholder('identity'))))
    .prepare(),
);

export function findSweepByIdentity(db: Database, productId: number, identity: string): number | undefined {
  return byIdentity(db).get({ productId, identity })?.id;
}

const byReading = prepared((db) =>
  db
    .select({ id: sweeps.id })
    .from(sweeps)
    .where(and(eq(sweeps.productId, sql.placeholder('productId')), eq(sweeps.readingHash, sql.placeholder('hash'))))
    .orderBy(asc(sweeps.id))
    .limit(1)
    .prepare(),
);

/** The first sweep of the product with the very same levels. */
export function findSameReading(db: Database, productId: number, readingHash: string): number | undefined {
  return byReading(db).get({ productId, hash: readingHash })?.id;
}

const insertion = prepared((db) => {
  const { id: _given, ...columns } = getTableColumns(sweeps);
  const values = Object.fromEntries(Object.keys(columns).map((name) => [name, sql.placeholder(name)]));
  return db
    .insert(sweeps)
    .values(values as Record<keyof NewSweep, Placeholder>)
    .prepare();
});

export function insertSweep(db: Database, sweep: NewSweep): number {
  return Number(insertion(db).run({ ...sweep, isSuperseded: false }).lastInsertRowid);
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
