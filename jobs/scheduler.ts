import cron from 'node-cron';
import type { Context } from '../server/context';
import type { Job } from './job';

/** Asks for what fell due while the process was down, then asks on schedule. Returns how to stop. */
export function startScheduler(context: Context, jobs: readonly Job[]): () => void {
  for (const job of jobs) request(context, job, 'start');
  const tasks = jobs.flatMap((job) =>
    job.schedule.map((expression) =>
      cron.schedule(expression, () => request(context, job, 'schedule'), { timezone: 'UTC' }),
    ),
  );
  return () => {
    for (const task of tasks) void task.stop();
  };
}

function request(context: Context, job: Job, trigger: 'schedule' | 'start'): void {
  try {
    job.request(context, trigger);
  } catch (error) {
    // One job that cannot be asked for, a locked database say, must not stop the clock of the others.
    context.log.error({ err: error, job: job.name }, 'could not ask for a run');
  }
}
