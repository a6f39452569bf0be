import { OPEN_DROP_STATES } from '@shared/contracts/drops';
import { and, asc, count, desc, eq, gt, gte, inArray, max, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { prepared } from '../db/prepared';
import { builds, drops, firmwareRevisions, hardwareRevisions, products } from '../db/schema';

export type Build = typeof builds.$inferSelect;

/** A build with the names of its revisions. */
export interface NamedBuild {
  build: Build;
  hardware: string;
  firmware: string;
  commit: string;
}

const NAMED = {
  build: builds,
  hardware: hardwareRevisions.name,
  firmware: firmwareRevisions.name,
  commit: firmwareRevisions.commit,
};

function namedBuilds(db: Database) {
  return db
    .select(NAMED)
    .from(builds)
    .innerJoin(hardwareRevisions, eq(hardwareRevisions.id, builds.hardwareId))
    .innerJoin(firmwareRevisions, eq(firmwareRevisions.id, builds.firmwareId));
}

/** Builds of a product, oldest first. */
export function listNamedBuilds(db: Database, productId: number): NamedBuild[] {
  return namedBuilds(db).where(eq(builds.productId, productId)).orderBy(asc(builds.position)).all();
}

export function findNamedBuild(db: Database, productId: number, buildId: number): NamedBuild | undefined {
  return namedBuilds(db)
    .where(and(eq(builds.productId, productId), eq(builds.id, buildId)))
    .get();
}

const byRevisions = prepared((db) =>
  namedBuilds(db)
    .where(
      and(
        eq(builds.productId, sql.placeholder('productId')),
        eq(hardwareRevisions.name, sql.placeholder('hardware')),
        eq(firmwareRevisions.name, sql.placeholder('firmware')),
      ),
    )
    .prepare(),
);

export function findBuildByRevisions(
  db: Database,
  productId: number,
  hardware: string,
  firmware: string,
): NamedBuild | undefined {
  return byRevisions(db).get({ productId, hardware, firmware });
}

/** The first position whose build is younger than `builtAt`, or one past the last. */
export function positionFor(db: Database, productId: number, builtAt: number): number {
  const older = db
    .select({ last: max(builds.position) })
    .from(builds)
    .where(and(eq(builds.productId, productId), sql`${builds.builtAt} <= ${builtAt}`))
    .get();
  return (older?.last ?? 0) + 1;
}

/** Makes room at a position. */
export function shiftPositions(db: Database, productId: number, from: number): void {
  db.update(builds)
    .set({ position: sql`${builds.position} + 1` })
    .where(and(eq(builds.productId, productId), gte(builds.position, from)))
    .run();
}

/** Takes a build out of the order; the caller gives it a new position. */
export function removePosition(db: Database, productId: number, build: Build): void {
  updateBuild(db, build.id, { position: 0, builtAt: 0 });
  db.update(builds)
    .set({ position: sql`${builds.position} - 1` })
    .where(and(eq(builds.productId, productId), gt(builds.position, build.position)))
    .run();
}

export function insertBuild(db: Database, build: typeof builds.$inferInsert): Build {
  return db.insert(builds).values(build).returning().get();
}

export function updateBuild(db: Database, id: number, change: Partial<typeof builds.$inferInsert>): Build {
  return db.update(builds).set(change).where(eq(builds.id, id)).returning().get();
}

/** Points the product at its newest build. */
export function updateLatestBuild(db: Database, productId: number): void {
  const latest = db
    .select({ id: builds.id })
    .from(builds)
    .where(eq(builds.productId, productId))
    .orderBy(desc(builds.position))
    .limit(1)
    .get();
  db.update(products)
    .set({ latestBuildId: latest?.id ?? null })
    .where(eq(products.id, productId))
    .run();
}

/** Open drops of a product's builds; builds without any are absent. */
export function openDropsByBuild(db: Database, productId: number): Map<number, number> {
  const rows = db
    .select({ buildId: drops.buildId, drops: count() })
    .from(drops)
    .where(and(eq(drops.productId, productId), inArray(drops.state, [...OPEN_DROP_STATES])))
    .groupBy(drops.buildId)
    .all();
  return new Map(rows.map((row) => [row.buildId, row.drops]));
}
