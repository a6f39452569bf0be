import type { Context } from '../context';
import { type JobRun, listLatestRuns } from './run-store';

/** The newest run with this lock, in whatever state. */
export function latestRun(context: Context, lockKey: string): JobRun | undefined {
  return latestRuns(context, lockKey, 1)[0];
}

/** The newest runs with this lock, in whatever state, newest first. */
export function latestRuns(context: Context, lockKey: string, limit: number): JobRun[] {
  return listLatestRuns(context.db, lockKey, limit);
}
