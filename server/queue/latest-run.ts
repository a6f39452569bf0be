import type { Context } from '../context';
import { findLatestRun, type JobRun } from './run-store';

/** The newest run with this lock, in whatever state. */
export function latestRun(context: Context, lockKey: string): JobRun | undefined {
  return findLatestRun(context.db, lockKey);
}
