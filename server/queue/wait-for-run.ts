import { setTimeout } from 'node:timers/promises';
import type { Context } from '../context';
import { findRun, type JobRun } from './run-store';

const LOOK_EVERY_MS = 100;

/** Waits until the run has ended, at most so long. Returns the run as it is then. */
export async function waitForRun(context: Context, id: number, atMostMs: number): Promise<JobRun> {
  for (let waitedMs = 0; ; waitedMs += LOOK_EVERY_MS) {
    const run = findRun(context.db, id);
    if (run === undefined) throw new Error(`run ${id} is gone`);
    if (hasEnded(run) || waitedMs >= atMostMs) return run;
    await setTimeout(LOOK_EVERY_MS);
  }
}

export function hasEnded({ status }: JobRun): boolean {
  return status === 'done' || status === 'failed';
}
