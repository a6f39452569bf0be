import type { JobRunView } from '@shared/contracts/job-runs';
import { isoTime, isoTimeOrNull } from '../iso-time';
import type { JobRun } from './run-store';

export function presentRun(run: JobRun): JobRunView {
  const { id, job, trigger, requestedBy, status, attempts, total, done, counts, errors } = run;
  return {
    id,
    job,
    trigger,
    requestedBy,
    status,
    attempts,
    total,
    done,
    counts,
    errors,
    queuedAt: isoTime(run.queuedAt),
    startedAt: isoTimeOrNull(run.startedAt),
    finishedAt: isoTimeOrNull(run.finishedAt),
  };
}
