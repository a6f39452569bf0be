import type { JobName } from '@shared/contracts/job-runs';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { expiredRuns, findWaitingRun, type JobRun, markRunning, nextClaimable, updateRun } from './run-store';

/** A worker that has not reported for this long is taken for dead and its run given to another. */
export const LEASE_MS = 60_000;
/** A run that killed its worker this often is given up. */
const MAX_ATTEMPTS = 3;

/** Takes the oldest waiting run for `worker`, or undefined when nothing waits. */
export function claimRun(context: Context, worker: string, jobs: readonly JobName[]): JobRun | undefined {
  return withTransaction(context.db, () => {
    const now = context.now();
    releaseExpired(context, now);
    const next = nextClaimable(context.db, jobs);
    return next && markRunning(context.db, next.id, worker, now, now + LEASE_MS);
  });
}

/** Puts runs of dead workers back into the queue. */
function releaseExpired(context: Context, now: number): void {
  for (const run of expiredRuns(context.db, now)) {
    const gone = { subject: run.claimedBy ?? 'worker', message: 'stopped without finishing the run' };
    const isReplaced = findWaitingRun(context.db, run.lockKey) !== undefined;
    if (isReplaced || run.attempts >= MAX_ATTEMPTS) {
      updateRun(context.db, run.id, { status: 'failed', finishedAt: now, errors: [...run.errors, gone] });
    } else {
      updateRun(context.db, run.id, { status: 'waiting', claimedBy: null, leaseUntil: null });
    }
  }
}
