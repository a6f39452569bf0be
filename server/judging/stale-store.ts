import { and, asc, eq, gt, gte, isNotNull, isNull, or, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { prepared } from '../db/prepared';
import { builds, firmwareRevisions, hardwareRevisions, products, teams } from '../db/schema';

/**
 * Data of the build changed after the version it was judged at. A build without sweeps has nothing to judge, unless it
 * was judged once and lost its sweeps since.
 */
const isStale = and(
  gt(builds.dataVersion, builds.judgedVersion),
  or(gt(builds.sweepCount, 0), isNotNull(builds.judgedAt)),
);

const versionRaise = prepared((db) =>
  db
    .update(builds)
    .set({ dataVersion: sql`${builds.dataVersion} + 1` })
    .where(
      and(
        eq(builds.productId, sql.placeholder('productId')),
        gte(builds.position, sql.placeholder('fromPosition')),
        gt(builds.sweepCount, 0),
      ),
    )
    .prepare(),
);

/** Raises the data version of the product's measured builds at and after the position. */
export function raiseDataVersions(db: Database, productId: number, fromPosition: number): void {
  versionRaise(db).run({ productId, fromPosition });
}

/** Stale builds of a product, oldest first. */
export function listStaleBuilds(db: Database, productId: number): { id: number; hardware: string; firmware: string }[] {
  return db
    .select({ id: builds.id, hardware: hardwareRevisions.name, firmware: firmwareRevisions.name })
    .from(builds)
    .innerJoin(hardwareRevisions, eq(hardwareRevisions.id, builds.hardwareId))
    .innerJoin(firmwareRevisions, eq(firmwareRevisions.id, builds.firmwareId))
    .where(and(eq(builds.productId, productId), isStale))
    .orderBy(asc(builds.position))
    .all();
}

/** Products in use that have a stale build. */
export function listStaleProducts(db: Database): { id: number; teamId: number }[] {
  return db
    .selectDistinct({ id: products.id, teamId: products.teamId })
    .from(builds)
    .innerJoin(products, eq(products.id, builds.productId))
    .innerJoin(teams, eq(teams.id, products.teamId))
    .where(and(isStale, isNull(products.archivedAt), eq(teams.isArchived, false)))
    .orderBy(asc(products.id))
    .all();
}

/** Products in use of a team. */
export function listProductIds(db: Database, teamId: number): number[] {
  return db
    .select({ id: products.id })
    .from(products)
    .where(and(eq(products.teamId, teamId), isNull(products.archivedAt)))
    .orderBy(asc(products.id))
    .all()
    .map(({ id }) => id);
}
