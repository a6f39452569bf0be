import type { Reason } from '@shared/judging/band-judgement';
import { and, eq, inArray, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { operatingStates, verdicts } from '../db/schema';

export type VerdictRow = typeof verdicts.$inferSelect;
export type NewVerdictRow = typeof verdicts.$inferInsert;

/** What an earlier judgement says, read out of the stored JSON without parsing the rest. */
export interface EarlierVerdict extends Pick<
  VerdictRow,
  'buildId' | 'stateId' | 'line' | 'detector' | 'band' | 'verdict' | 'differenceDb'
> {
  reasons: Reason[];
  thresholdDb: number;
}

export function listEarlierVerdicts(
  db: Database,
  buildIds: readonly number[],
  stateIds: readonly number[],
): EarlierVerdict[] {
  return db
    .select({
      buildId: verdicts.buildId,
      stateId: verdicts.stateId,
      line: verdicts.line,
      detector: verdicts.detector,
      band: verdicts.band,
      verdict: verdicts.verdict,
      differenceDb: verdicts.differenceDb,
      reasons: sql<string>`json_extract(${verdicts.judgement}, '$.reasons')`,
      thresholdDb: sql<number>`json_extract(${verdicts.judgement}, '$.thresholdDb')`,
    })
    .from(verdicts)
    .where(and(inArray(verdicts.buildId, [...buildIds]), inArray(verdicts.stateId, [...stateIds])))
    .all()
    .map((row) => ({ ...row, reasons: JSON.parse(row.reasons) as Reason[] }));
}

export function listVerdicts(db: Database, buildId: number): VerdictRow[] {
  return db.select().from(verdicts).where(eq(verdicts.buildId, buildId)).orderBy(verdicts.id).all();
}

/** Verdicts of a build with the names of their states, in the order they were judged in. */
export function listNamedVerdicts(db: Database, buildId: number): { verdict: VerdictRow; state: string }[] {
  return db
    .select({ verdict: verdicts, state: operatingStates.name })
    .from(verdicts)
    .innerJoin(operatingStates, eq(operatingStates.id, verdicts.stateId))
    .where(eq(verdicts.buildId, buildId))
    .orderBy(operatingStates.position, verdicts.id)
    .all();
}

/** Stores the verdict of a band of a series in the place of the former one. */
export function upsertVerdict(db: Database, row: NewVerdictRow): void {
  const { buildId: _buildId, stateId: _stateId, line: _line, detector: _detector, band: _band, ...change } = row;
  db.insert(verdicts)
    .values(row)
    .onConflictDoUpdate({
      target: [verdicts.buildId, verdicts.stateId, verdicts.line, verdicts.detector, verdicts.band],
      set: change,
    })
    .run();
}

export function deleteVerdicts(db: Database, ids: readonly number[]): void {
  db.delete(verdicts)
    .where(inArray(verdicts.id, [...ids]))
    .run();
}
