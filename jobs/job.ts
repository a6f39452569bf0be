import type { JobName } from '@shared/contracts/job-runs';
import type { Context } from '../server/context';
import type { HeldRun } from '../server/queue/held-run';

/** One kind of work of the jobs process: what runs, and when it is asked for. */
export interface Job {
  readonly name: JobName;
  /** Works through the run; progress and failures of single items go to `held`. */
  run(context: Context, held: HeldRun): void | Promise<void>;
  /** Cron expressions in UTC, at which `request` puts the runs that are due into the queue. */
  readonly schedule: readonly string[];
  request(context: Context, trigger: 'schedule' | 'start'): void;
}
