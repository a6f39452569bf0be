import type { Context } from '../context';
import { deleteOldBeats, latestBeat, upsertBeat } from './run-store';

/** A worker reports this often. */
export const BEAT_EVERY_MS = 5_000;
/** After this long without a report the jobs process counts as down. */
const BEAT_TIMEOUT_MS = 30_000;

/** Says that the worker is alive. */
export function beat(context: Context, worker: string, startedAt: number): void {
  upsertBeat(context.db, worker, startedAt, context.now());
  deleteOldBeats(context.db, context.now() - 24 * 3600_000);
}

/** Whether some worker of the jobs process is alive. */
export function jobsAreUp(context: Context): boolean {
  const seenAt = latestBeat(context.db);
  return seenAt !== undefined && context.now() - seenAt < BEAT_TIMEOUT_MS;
}
