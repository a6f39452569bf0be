import { and, asc, eq, inArray, isNull, type SQL } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
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

export function listDropsById(db: Database, ids: readonly number[]): DropRow[] {
  return db
    .select()
    .from(drops)
    .where(inArray(drops.id, [...ids]))
    .orderBy(asc(drops.id))
    .all();
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
      buildPosition: builds.position,
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

/** In the order they were raised in. */
export function listNamedDrops(db: Database, { teamId, productId, states, ownerId }: DropFilter): NamedDrop[] {
  const conditions: (SQL | undefined)[] = [
    teamId === undefined ? undefined : eq(drops.teamId, teamId),
    productId === undefined ? undefined : eq(drops.productId, productId),
    states === undefined ? undefined : inArray(drops.state, [...states]),
    ownerId === undefined ? undefined : ownerId === null ? isNull(drops.ownerId) : eq(drops.ownerId, ownerId),
  ];
  return selectNamed(db)
    .where(and(...conditions))
    .orderBy(asc(drops.id))
    .all();
}

/** A drop with the positions of its build and of the one that shows it fixed. */
export interface PlacedDrop {
  drop: DropRow;
  position: number;
  fixedPosition: number | null;
}

/** Drops of a product that the data support, in the order they were raised in. */
export function listSupportedDrops(db: Database, productId: number): PlacedDrop[] {
  const fixing = alias(builds, 'fixing');
  return db
    .select({ drop: drops, position: builds.position, fixedPosition: fixing.position })
    .from(drops)
    .innerJoin(builds, eq(builds.id, drops.buildId))
    .leftJoin(fixing, eq(fixing.id, drops.fixedByBuildId))
    .where(and(eq(drops.productId, productId), eq(drops.isSupported, true)))
    .orderBy(asc(drops.id))
    .all();
}
