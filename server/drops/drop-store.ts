import { OPEN_DROP_STATES } from '@shared/contracts/drops';
import { and, asc, count, desc, eq, inArray, type SQL, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import {
  builds,
  drops,
  dropEvents,
  firmwareRevisions,
  hardwareRevisions,
  operatingStates,
  people,
  products,
  teams,
} from '../db/schema';

export type DropRow = typeof drops.$inferSelect;
export type NewDropRow = typeof drops.$inferInsert;
export type DropEvent = typeof dropEvents.$inferSelect;
export type NewDropEvent = typeof dropEvents.$inferInsert;

export function listDropsOfBuild(db: Database, buildId: number): DropRow[] {
  return db.select().from(drops).where(eq(drops.buildId, buildId)).orderBy(asc(drops.id)).all();
}

export function findDrop(db: Database, id: number): DropRow | undefined {
  return db.select().from(drops).where(eq(drops.id, id)).get();
}

export function insertDrop(db: Database, drop: NewDropRow): DropRow {
  return db.insert(drops).values(drop).returning().get();
}

export function updateDrop(db: Database, id: number, change: Partial<NewDropRow>): void {
  db.update(drops).set(change).where(eq(drops.id, id)).run();
}

export function insertDropEvent(db: Database, event: NewDropEvent): void {
  db.insert(dropEvents).values(event).run();
}

/** Oldest first. */
export function listDropEvents(db: Database, dropId: number): DropEvent[] {
  return db.select().from(dropEvents).where(eq(dropEvents.dropId, dropId)).orderBy(asc(dropEvents.id)).all();
}

/** The latest event that says whether the data support the drop. */
export function latestDataEvent(db: Database, dropId: number): DropEvent | undefined {
  const aboutData = inArray(dropEvents.kind, ['raised', 'evidence', 'withdrawn']);
  return db
    .select()
    .from(dropEvents)
    .where(and(eq(dropEvents.dropId, dropId), aboutData))
    .orderBy(desc(dropEvents.id))
    .limit(1)
    .get();
}

const isOpen = inArray(drops.state, [...OPEN_DROP_STATES]);

/** Open drops by product; products without any are absent. */
export function countOpenByProduct(db: Database, productIds: readonly number[]): Map<number, number> {
  const rows = db
    .select({ id: drops.productId, drops: count() })
    .from(drops)
    .where(and(inArray(drops.productId, [...productIds]), isOpen))
    .groupBy(drops.productId)
    .all();
  return new Map(rows.map((row) => [row.id, row.drops]));
}

/** Open drops by build; builds without any are absent. */
export function countOpenByBuild(db: Database, buildIds: readonly number[]): Map<number, number> {
  const rows = db
    .select({ id: drops.buildId, drops: count() })
    .from(drops)
    .where(and(inArray(drops.buildId, [...buildIds]), isOpen))
    .groupBy(drops.buildId)
    .all();
  return new Map(rows.map((row) => [row.id, row.drops]));
}

/** Which drops to list. */
export interface DropFilter {
  teamId?: number;
  productId?: number;
  states?: readonly DropRow['state'][];
  /** Null: drops nobody owns. */
  ownerId?: number | null;
}

/** A drop with the names a list shows. */
export type NamedDrop = ReturnType<ReturnType<typeof selectNamed>['all']>[number];

function selectNamed(db: Database) {
  return db
    .select({
      drop: drops,
      product: products.key,
      productName: products.name,
      team: teams.key,
      hardware: hardwareRevisions.name,
      firmware: firmwareRevisions.name,
      buildSwitching: builds.switching,
      operatingState: operatingStates.name,
      ownerName: people.name,
    })
    .from(drops)
    .innerJoin(products, eq(products.id, drops.productId))
    .innerJoin(teams, eq(teams.id, drops.teamId))
    .innerJoin(builds, eq(builds.id, drops.buildId))
    .innerJoin(hardwareRevisions, eq(hardwareRevisions.id, builds.hardwareId))
    .innerJoin(firmwareRevisions, eq(firmwareRevisions.id, builds.firmwareId))
    .innerJoin(operatingStates, eq(operatingStates.id, drops.stateId))
    .leftJoin(people, eq(people.id, drops.ownerId));
}

export function findNamedDrop(db: Database, id: number): NamedDrop | undefined {
  return selectNamed(db).where(eq(drops.id, id)).get();
}

/** Open ones first, then over the limit, then the least margin left, then the largest loss. */
export function listNamedDrops(db: Database, { teamId, productId, states, ownerId }: DropFilter): NamedDrop[] {
  const conditions: (SQL | undefined)[] = [
    teamId === undefined ? undefined : eq(drops.teamId, teamId),
    productId === undefined ? undefined : eq(drops.productId, productId),
    states === undefined ? undefined : inArray(drops.state, [...states]),
    ownerId === undefined ? undefined : ownerId === null ? sql`${drops.ownerId} is null` : eq(drops.ownerId, ownerId),
  ];
  return selectNamed(db)
    .where(and(...conditions))
    .orderBy(desc(isOpen), desc(drops.isOverLimit), asc(drops.marginDb), asc(drops.differenceDb), asc(drops.id))
    .all();
}
