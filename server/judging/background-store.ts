import { and, asc, between, eq, inArray } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { sweeps } from '../db/schema';

const COLUMNS = {
  id: sweeps.id,
  benchId: sweeps.benchId,
  line: sweeps.line,
  detector: sweeps.detector,
  correction: sweeps.correction,
  takenAt: sweeps.takenAt,
};

export type BackgroundSweep = Pick<typeof sweeps.$inferSelect, keyof typeof COLUMNS>;

/** Sweeps with the equipment off on the benches between two times. */
export function listBackgrounds(
  db: Database,
  benchIds: readonly number[],
  from: number,
  to: number,
): BackgroundSweep[] {
  return db
    .select(COLUMNS)
    .from(sweeps)
    .where(
      and(inArray(sweeps.benchId, [...benchIds]), between(sweeps.takenAt, from, to), eq(sweeps.kind, 'background')),
    )
    .orderBy(asc(sweeps.takenAt), asc(sweeps.id))
    .all();
}
