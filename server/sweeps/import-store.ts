import { and, asc, count, desc, eq, isNull } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { importBatches, importItems, people, products, sweeps } from '../db/schema';

export type ImportBatch = typeof importBatches.$inferSelect;
export type ImportItem = typeof importItems.$inferSelect;
export type NewImportItem = Omit<typeof importItems.$inferInsert, 'batchId'>;
export type ItemStatus = ImportItem['status'];

/** A batch with the name of the person who handed it over. */
export interface NamedBatch {
  batch: ImportBatch;
  createdBy: string;
}

/** An item with what became of it. */
export interface ItemResult {
  item: ImportItem;
  productKey: string | null;
  productName: string | null;
  buildId: number | null;
  worstMarginDb: number | null;
}

export function insertBatch(
  db: Database,
  batch: typeof importBatches.$inferInsert,
  items: readonly NewImportItem[],
): ImportBatch {
  const stored = db.insert(importBatches).values(batch).returning().get();
  for (const item of items) {
    db.insert(importItems)
      .values({ ...item, batchId: stored.id })
      .run();
  }
  return stored;
}

export function findBatchById(db: Database, id: number): ImportBatch | undefined {
  return db.select().from(importBatches).where(eq(importBatches.id, id)).get();
}

function namedBatches(db: Database) {
  return db
    .select({ batch: importBatches, createdBy: people.name })
    .from(importBatches)
    .innerJoin(people, eq(people.id, importBatches.createdBy));
}

export function findNamedBatch(db: Database, teamId: number, id: number): NamedBatch | undefined {
  return namedBatches(db)
    .where(and(eq(importBatches.teamId, teamId), eq(importBatches.id, id)))
    .get();
}

/** Batches of a team, newest first. */
export function listNamedBatches(db: Database, teamId: number, most: number): NamedBatch[] {
  return namedBatches(db).where(eq(importBatches.teamId, teamId)).orderBy(desc(importBatches.id)).limit(most).all();
}

/** Batches with files still to import, oldest first. */
export function listOpenBatches(db: Database): ImportBatch[] {
  return db.select().from(importBatches).where(isNull(importBatches.finishedAt)).orderBy(asc(importBatches.id)).all();
}

export function finishBatch(db: Database, id: number, finishedAt: number): void {
  db.update(importBatches).set({ finishedAt }).where(eq(importBatches.id, id)).run();
}

export function listWaitingItems(db: Database, batchId: number): ImportItem[] {
  return db
    .select()
    .from(importItems)
    .where(and(eq(importItems.batchId, batchId), eq(importItems.status, 'waiting')))
    .orderBy(asc(importItems.id))
    .all();
}

/** Records what became of an item, if it still waits. */
export function settleItem(
  db: Database,
  id: number,
  result: Pick<ImportItem, 'status'> & Partial<Pick<ImportItem, 'sweepId' | 'problem'>>,
): boolean {
  const waits = and(eq(importItems.id, id), eq(importItems.status, 'waiting'));
  return db.update(importItems).set(result).where(waits).run().changes === 1;
}

export function countItems(db: Database, batchId: number): Map<ItemStatus, number> {
  const rows = db
    .select({ status: importItems.status, items: count() })
    .from(importItems)
    .where(eq(importItems.batchId, batchId))
    .groupBy(importItems.status)
    .all();
  return new Map(rows.map(({ status, items }) => [status, items]));
}

export function listItemResults(db: Database, batchId: number): ItemResult[] {
  return db
    .select({
      item: importItems,
      productKey: products.key,
      productName: products.name,
      buildId: sweeps.buildId,
      worstMarginDb: sweeps.worstMarginDb,
    })
    .from(importItems)
    .leftJoin(sweeps, eq(sweeps.id, importItems.sweepId))
    .leftJoin(products, eq(products.id, sweeps.productId))
    .where(eq(importItems.batchId, batchId))
    .orderBy(asc(importItems.id))
    .all();
}

/** Products that a batch brought sweeps to. */
export function listImportedProducts(db: Database, batchId: number): { id: number; teamId: number }[] {
  return db
    .selectDistinct({ id: sweeps.productId, teamId: sweeps.teamId })
    .from(sweeps)
    .where(eq(sweeps.batchId, batchId))
    .all();
}
