import type { JudgedSpread } from '@shared/judging/band-judgement';
import { and, asc, count, desc, eq, isNotNull, max, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { prepared } from '../db/prepared';
import { benches, builds, firmwareRevisions, hardwareRevisions, products, sweeps, verdicts } from '../db/schema';

export type Bench = typeof benches.$inferSelect;
export type BenchChange = Partial<Omit<typeof benches.$inferInsert, 'id' | 'teamId' | 'key' | 'createdAt'>>;

export interface BenchUse {
  sweepCount: number;
  lastSweepAt: number | null;
}

export function listBenchesOf(db: Database, teamId: number): Bench[] {
  return db.select().from(benches).where(eq(benches.teamId, teamId)).orderBy(asc(benches.name)).all();
}

const byKey = prepared((db) =>
  db
    .select()
    .from(benches)
    .where(and(eq(benches.teamId, sql.placeholder('teamId')), eq(benches.key, sql.placeholder('key'))))
    .prepare(),
);

export function findBenchByKey(db: Database, teamId: number, key: string): Bench | undefined {
  return byKey(db).get({ teamId, key });
}

export function insertBench(db: Database, bench: typeof benches.$inferInsert): Bench {
  return db.insert(benches).values(bench).returning().get();
}

export function updateBench(db: Database, id: number, change: BenchChange): Bench {
  return db.update(benches).set(change).where(eq(benches.id, id)).returning().get();
}

/** How many sweeps a bench took, and when the last one; read from an index alone. */
export function benchUse(db: Database, benchId: number): BenchUse {
  const use = db
    .select({ sweepCount: count(), lastSweepAt: max(sweeps.takenAt) })
    .from(sweeps)
    .where(eq(sweeps.benchId, benchId))
    .get();
  return use ?? { sweepCount: 0, lastSweepAt: null };
}

export interface BuildSpread {
  product: string;
  hardware: string;
  firmware: string;
  spread: JudgedSpread;
}

/** The spreads that the judgement used for the last judged build measured on a bench. */
export function listLastSpreads(db: Database, benchId: number): BuildSpread[] {
  const last = db
    .select({ buildId: sweeps.buildId })
    .from(sweeps)
    .innerJoin(builds, eq(builds.id, sweeps.buildId))
    .where(and(eq(sweeps.benchId, benchId), eq(sweeps.kind, 'product'), isNotNull(builds.judgedAt)))
    .orderBy(desc(sweeps.takenAt))
    .limit(1)
    .get();
  if (last === undefined) return [];
  return db
    .select({
      product: products.key,
      hardware: hardwareRevisions.name,
      firmware: firmwareRevisions.name,
      judgement: verdicts.judgement,
    })
    .from(verdicts)
    .innerJoin(builds, eq(builds.id, verdicts.buildId))
    .innerJoin(products, eq(products.id, builds.productId))
    .innerJoin(hardwareRevisions, eq(hardwareRevisions.id, builds.hardwareId))
    .innerJoin(firmwareRevisions, eq(firmwareRevisions.id, builds.firmwareId))
    .where(eq(verdicts.buildId, last.buildId))
    .all()
    .flatMap(({ judgement, ...build }) => (judgement.spread === null ? [] : [{ ...build, spread: judgement.spread }]));
}
