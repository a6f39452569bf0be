import { and, asc, desc, eq, getTableColumns, gt, inArray, lt, lte } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { builds, firmwareRevisions, hardwareRevisions, referenceChoices } from '../db/schema';

/** A build with the names of its revisions. */
export type JudgedBuild = typeof builds.$inferSelect & { hardware: string; firmware: string };

const NAMED = { ...getTableColumns(builds), hardware: hardwareRevisions.name, firmware: firmwareRevisions.name };

function namedBuilds(db: Database) {
  return db
    .select(NAMED)
    .from(builds)
    .innerJoin(hardwareRevisions, eq(hardwareRevisions.id, builds.hardwareId))
    .innerJoin(firmwareRevisions, eq(firmwareRevisions.id, builds.firmwareId));
}

export function findJudgedBuild(db: Database, id: number): JudgedBuild | undefined {
  return namedBuilds(db).where(eq(builds.id, id)).get();
}

/** Oldest first. */
export function listBuildsById(db: Database, ids: readonly number[]): JudgedBuild[] {
  return namedBuilds(db)
    .where(inArray(builds.id, [...ids]))
    .orderBy(asc(builds.position))
    .all();
}

/** The latest `limit` measured builds before a position, oldest first. */
export function listMeasuredBefore(db: Database, productId: number, position: number, limit: number): JudgedBuild[] {
  return namedBuilds(db)
    .where(and(eq(builds.productId, productId), lt(builds.position, position), gt(builds.sweepCount, 0)))
    .orderBy(desc(builds.position))
    .limit(limit)
    .all()
    .reverse();
}

/** Builds after one position up to another, oldest first. */
export function listBuildsBetween(db: Database, productId: number, after: number, upTo: number): JudgedBuild[] {
  return namedBuilds(db)
    .where(and(eq(builds.productId, productId), gt(builds.position, after), lte(builds.position, upTo)))
    .orderBy(asc(builds.position))
    .all();
}

/** Reference choices of a product, newest first; `position` is null for "no build: pooled". */
export function listReferenceChoices(
  db: Database,
  productId: number,
): { buildId: number | null; position: number | null }[] {
  return db
    .select({ buildId: referenceChoices.buildId, position: builds.position })
    .from(referenceChoices)
    .leftJoin(builds, eq(builds.id, referenceChoices.buildId))
    .where(eq(referenceChoices.productId, productId))
    .orderBy(desc(referenceChoices.chosenAt), desc(referenceChoices.id))
    .all();
}

export function updateJudgedBuild(
  db: Database,
  id: number,
  judged: Pick<JudgedBuild, 'verdict' | 'judgedAt' | 'judgedVersion'>,
): void {
  db.update(builds).set(judged).where(eq(builds.id, id)).run();
}
