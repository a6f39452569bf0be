import { and, asc, eq, getTableColumns, inArray } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { builds, dropSightings, firmwareRevisions, hardwareRevisions } from '../db/schema';

export type SightingRow = typeof dropSightings.$inferSelect;
export type SightedLoss = NonNullable<SightingRow['loss']>;

/** A sighting with where its build stands among the product's builds, and its name. */
export interface PlacedSighting extends SightingRow {
  position: number;
  hardware: string;
  firmware: string;
}

/** What other builds say about the drops, oldest build first. */
export function listSightings(db: Database, dropIds: readonly number[]): PlacedSighting[] {
  return db
    .select({
      ...getTableColumns(dropSightings),
      position: builds.position,
      hardware: hardwareRevisions.name,
      firmware: firmwareRevisions.name,
    })
    .from(dropSightings)
    .innerJoin(builds, eq(builds.id, dropSightings.buildId))
    .innerJoin(hardwareRevisions, eq(hardwareRevisions.id, builds.hardwareId))
    .innerJoin(firmwareRevisions, eq(firmwareRevisions.id, builds.firmwareId))
    .where(inArray(dropSightings.dropId, [...dropIds]))
    .orderBy(asc(builds.position))
    .all();
}

/** Drops raised on other builds that the build shows too. */
export function listDropsSeenIn(db: Database, buildId: number): number[] {
  return db
    .select()
    .from(dropSightings)
    .where(eq(dropSightings.buildId, buildId))
    .orderBy(asc(dropSightings.dropId))
    .all()
    .flatMap(({ dropId, loss }) => (loss === null ? [] : [dropId]));
}

/** Stores what a build says about a drop in the place of what it said before. */
export function upsertSighting(db: Database, sighting: Omit<SightingRow, 'id'>): void {
  db.insert(dropSightings)
    .values(sighting)
    .onConflictDoUpdate({
      target: [dropSightings.dropId, dropSightings.buildId],
      set: { loss: sighting.loss },
    })
    .run();
}

export function deleteSighting(db: Database, dropId: number, buildId: number): void {
  db.delete(dropSightings)
    .where(and(eq(dropSightings.dropId, dropId), eq(dropSightings.buildId, buildId)))
    .run();
}

export function deleteSightings(db: Database, dropId: number): void {
  db.delete(dropSightings).where(eq(dropSightings.dropId, dropId)).run();
}
