import { and, asc, between, eq, gte, inArray, lt, ne } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { builds, products, sweeps, verdicts } from '../db/schema';

export interface DaySweep extends Pick<
  typeof sweeps.$inferSelect,
  'productId' | 'buildId' | 'stateId' | 'line' | 'detector' | 'takenAt' | 'bands'
> {
  productName: string;
  position: number;
}

const DAY_SWEEP = {
  productId: sweeps.productId,
  buildId: sweeps.buildId,
  stateId: sweeps.stateId,
  line: sweeps.line,
  detector: sweeps.detector,
  takenAt: sweeps.takenAt,
  bands: sweeps.bands,
  productName: products.name,
  position: builds.position,
};

function selectDaySweeps(db: Database) {
  return db
    .select(DAY_SWEEP)
    .from(sweeps)
    .innerJoin(products, eq(products.id, sweeps.productId))
    .innerJoin(builds, eq(builds.id, sweeps.buildId));
}

/** Product sweeps of other products taken on one of the benches between two times. */
export function listOtherProductSweeps(
  db: Database,
  productId: number,
  benchIds: readonly number[],
  from: number,
  to: number,
): DaySweep[] {
  return selectDaySweeps(db)
    .where(
      and(
        inArray(sweeps.benchId, [...benchIds]),
        between(sweeps.takenAt, from, to),
        eq(sweeps.kind, 'product'),
        ne(sweeps.productId, productId),
      ),
    )
    .orderBy(asc(sweeps.id))
    .all();
}

/** Product sweeps of a product's builds from one position up to, not including, another, taken before a time. */
export function listSweepsBefore(
  db: Database,
  productId: number,
  [fromPosition, endPosition]: readonly [number, number],
  before: number,
): DaySweep[] {
  return selectDaySweeps(db)
    .where(
      and(
        eq(sweeps.productId, productId),
        eq(sweeps.kind, 'product'),
        gte(builds.position, fromPosition),
        lt(builds.position, endPosition),
        lt(sweeps.takenAt, before),
      ),
    )
    .orderBy(asc(sweeps.id))
    .all();
}

/** Of these builds, the ones with a band judged lost or gained. */
export function listChangedBuilds(
  db: Database,
  buildIds: readonly number[],
): { productId: number; position: number }[] {
  return db
    .selectDistinct({ productId: builds.productId, position: builds.position })
    .from(verdicts)
    .innerJoin(builds, eq(builds.id, verdicts.buildId))
    .where(and(inArray(verdicts.buildId, [...buildIds]), inArray(verdicts.verdict, ['lost', 'gained'])))
    .all();
}
