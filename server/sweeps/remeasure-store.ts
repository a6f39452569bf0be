import { asc, eq, inArray } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { builds, frequencyGrids, products, sweeps } from '../db/schema';

export type SweepChange = Partial<typeof sweeps.$inferInsert>;

/** Row ids of a team's sweeps, those of a build together. */
export function listSweepIds(db: Database, teamId: number): number[] {
  return db
    .select({ id: sweeps.id })
    .from(sweeps)
    .where(eq(sweeps.teamId, teamId))
    .orderBy(asc(sweeps.buildId), asc(sweeps.id))
    .all()
    .map(({ id }) => id);
}

/** What the sweeps were measured against, and what their products plan now; sweeps that are gone are left out. */
export function listMeasuredSweeps(db: Database, ids: readonly number[]) {
  return db
    .select({
      id: sweeps.id,
      productId: sweeps.productId,
      buildId: sweeps.buildId,
      position: builds.position,
      detector: sweeps.detector,
      remarks: sweeps.remarks,
      limitSetKey: sweeps.limitSetKey,
      limitSetVersion: sweeps.limitSetVersion,
      bands: sweeps.bands,
      gridHash: frequencyGrids.hash,
      plannedSetKey: products.limitSetKey,
    })
    .from(sweeps)
    .innerJoin(builds, eq(builds.id, sweeps.buildId))
    .innerJoin(frequencyGrids, eq(frequencyGrids.id, sweeps.gridId))
    .innerJoin(products, eq(products.id, sweeps.productId))
    .where(inArray(sweeps.id, [...ids]))
    .all();
}

export type RemeasuredSweep = ReturnType<typeof listMeasuredSweeps>[number];

export function updateSweep(db: Database, id: number, change: SweepChange): void {
  db.update(sweeps).set(change).where(eq(sweeps.id, id)).run();
}

/** Versions of limit sets that sweeps were measured against, by team. */
export function listMeasuredLimits(db: Database) {
  const { teamId, limitSetKey, limitSetVersion } = sweeps;
  return db.selectDistinct({ teamId, limitSetKey, limitSetVersion }).from(sweeps).orderBy(asc(teamId)).all();
}
