import type { Actor } from '../actor';
import type { Context } from '../context';
import { findRunByOnceKey, findWaitingRun, insertRun, type JobRun, type NewJobRun } from './run-store';

export interface RunRequest extends Pick<NewJobRun, 'job' | 'lockKey' | 'onceKey' | 'payload'> {
  /** Null for a job over the whole installation. */
  teamId: number | null;
  trigger: JobRun['trigger'];
}

/**
 * Asks the jobs process for a run. When one with the same lock waits already, that one serves; a running one does not,
 * for it may have passed what is new.
 */
export function enqueueRun(context: Context, actor: Actor, request: RunRequest): JobRun {
  const { db } = context;
  const run = insertRun(db, { ...request, requestedBy: actor.name, queuedAt: context.now() });
  const standing = request.onceKey ? findRunByOnceKey(db, request.onceKey) : undefined;
  const served = run ?? standing ?? findWaitingRun(db, request.lockKey);
  if (served === undefined) throw new Error(`the run ${request.lockKey} was neither stored nor found`);
  return served;
}
