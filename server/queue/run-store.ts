import type { JobName } from '@shared/contracts/job-runs';
import { and, asc, desc, eq, inArray, isNull, lt, notInArray, or, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { jobRuns, workerBeats } from '../db/schema';

export type JobRun = typeof jobRuns.$inferSelect;
export type NewJobRun = typeof jobRuns.$inferInsert;

export function findRun(db: Database, id: number): JobRun | undefined {
  return db.select().from(jobRuns).where(eq(jobRuns.id, id)).get();
}

/** Inserts the run unless one with its lock already waits, or one with its once-key ever was. */
export function insertRun(db: Database, run: NewJobRun): JobRun | undefined {
  return db.insert(jobRuns).values(run).onConflictDoNothing().returning().get();
}

export function findWaitingRun(db: Database, lockKey: string): JobRun | undefined {
  return db
    .select()
    .from(jobRuns)
    .where(and(eq(jobRuns.lockKey, lockKey), eq(jobRuns.status, 'waiting')))
    .get();
}

export function findRunByOnceKey(db: Database, onceKey: string): JobRun | undefined {
  return db.select().from(jobRuns).where(eq(jobRuns.onceKey, onceKey)).get();
}

/** The newest runs with this lock in whatever state, newest first. */
export function listLatestRuns(db: Database, lockKey: string, limit: number): JobRun[] {
  return db.select().from(jobRuns).where(eq(jobRuns.lockKey, lockKey)).orderBy(desc(jobRuns.id)).limit(limit).all();
}

/** The oldest waiting run whose lock nobody holds. */
export function nextClaimable(db: Database, jobs: readonly JobName[]): JobRun | undefined {
  const held = db.select({ lockKey: jobRuns.lockKey }).from(jobRuns).where(eq(jobRuns.status, 'running'));
  return db
    .select()
    .from(jobRuns)
    .where(and(eq(jobRuns.status, 'waiting'), inArray(jobRuns.job, [...jobs]), notInArray(jobRuns.lockKey, held)))
    .orderBy(asc(jobRuns.queuedAt), asc(jobRuns.id))
    .limit(1)
    .get();
}

/** Takes the run if it still waits. */
export function markRunning(
  db: Database,
  id: number,
  worker: string,
  now: number,
  leaseUntil: number,
): JobRun | undefined {
  return db
    .update(jobRuns)
    .set({
      status: 'running',
      claimedBy: worker,
      leaseUntil,
      startedAt: sql`coalesce(${jobRuns.startedAt}, ${now})`,
      attempts: sql`${jobRuns.attempts} + 1`,
    })
    .where(and(eq(jobRuns.id, id), eq(jobRuns.status, 'waiting')))
    .returning()
    .get();
}

/** Changes a run this worker holds; false when it no longer holds it. */
export function updateHeldRun(db: Database, id: number, worker: string, change: Partial<NewJobRun>): boolean {
  const held = and(eq(jobRuns.id, id), eq(jobRuns.status, 'running'), eq(jobRuns.claimedBy, worker));
  return db.update(jobRuns).set(change).where(held).run().changes === 1;
}

export function expiredRuns(db: Database, now: number): JobRun[] {
  return db
    .select()
    .from(jobRuns)
    .where(and(eq(jobRuns.status, 'running'), or(isNull(jobRuns.leaseUntil), lt(jobRuns.leaseUntil, now))))
    .all();
}

export function updateRun(db: Database, id: number, change: Partial<NewJobRun>): void {
  db.update(jobRuns).set(change).where(eq(jobRuns.id, id)).run();
}

/** Runs of a team, newest first. */
export function listRuns(db: Database, teamId: number, limit: number): JobRun[] {
  return db.select().from(jobRuns).where(eq(jobRuns.teamId, teamId)).orderBy(desc(jobRuns.id)).limit(limit).all();
}

/** Removes ended runs queued before `before`, except those that guard a once-key. */
export function deleteEndedRuns(db: Database, before: number): number {
  const ended = and(inArray(jobRuns.status, ['done', 'failed']), lt(jobRuns.queuedAt, before), isNull(jobRuns.onceKey));
  return db.delete(jobRuns).where(ended).run().changes;
}

export function upsertBeat(db: Database, worker: string, startedAt: number, seenAt: number): void {
  db.insert(workerBeats)
    .values({ worker, startedAt, seenAt })
    .onConflictDoUpdate({ target: workerBeats.worker, set: { seenAt } })
    .run();
}

export function latestBeat(db: Database): number | undefined {
  return db.select({ seenAt: workerBeats.seenAt }).from(workerBeats).orderBy(desc(workerBeats.seenAt)).limit(1).get()
    ?.seenAt;
}

export function deleteOldBeats(db: Database, before: number): void {
  db.delete(workerBeats).where(lt(workerBeats.seenAt, before)).run();
}
