import { setTimeout } from 'node:timers/promises';
import type { Context } from '../server/context';
import { claimRun } from '../server/queue/claim-run';
import { HeldRun, RunLostError } from '../server/queue/held-run';
import { beat, BEAT_EVERY_MS } from '../server/queue/worker-beat';
import type { Job } from './job';

/** How soon after it was asked for a run begins. */
const POLL_MS = 400;

/** Takes the next waiting run, works it and records how it ended. Returns whether there was one. */
export async function workOnce(context: Context, worker: string, jobs: readonly Job[]): Promise<boolean> {
  const run = claimRun(
    context,
    worker,
    jobs.map((job) => job.name),
  );
  const job = jobs.find(({ name }) => name === run?.job);
  if (run === undefined || job === undefined) return false;
  const held = new HeldRun(context, run, worker);
  const log = context.log.child({ job: run.job, run: run.id });
  try {
    await job.run(context, held);
    held.finish();
    log.info('run finished');
  } catch (error) {
    log.error({ err: error }, 'run failed');
    // What another worker holds by now is not this one's to end.
    if (!(error instanceof RunLostError)) attempt(context, () => held.fail(error));
  }
  return true;
}

/**
 * Does something with the database that may fail for a moment, locked or full: logged, and left to the next time, for a
 * worker that dies of it takes the web server with it.
 */
function attempt(context: Context, work: () => void): void {
  try {
    work();
  } catch (error) {
    context.log.error({ err: error }, 'the worker could not write to the database');
  }
}

/** Works until `signal` aborts; a run in hand is finished first. */
export async function startWorker(
  context: Context,
  worker: string,
  jobs: readonly Job[],
  signal: AbortSignal,
): Promise<void> {
  const startedAt = context.now();
  const report = () => attempt(context, () => beat(context, worker, startedAt));
  report();
  const pulse = setInterval(report, BEAT_EVERY_MS);
  while (!signal.aborted) {
    const hasWorked = await workOnce(context, worker, jobs).catch((error: unknown) => {
      context.log.error({ err: error }, 'the worker could not take a run');
      return false;
    });
    if (!hasWorked) await setTimeout(POLL_MS, undefined, { signal }).catch(() => undefined);
  }
  clearInterval(pulse);
}
