import type { Actor } from '../actor';
import type { Context } from '../context';
import { enqueueRun } from '../queue/enqueue-run';
import type { JobRun } from '../queue/run-store';
import type { ImportBatch } from './import-store';

/** At most one run works through a batch. */
export function batchLock(batchId: number): string {
  return `import:${batchId}`;
}

/** Asks the jobs process to work through the batch. */
export function enqueueBatch(context: Context, actor: Actor, batch: ImportBatch, trigger: JobRun['trigger']): void {
  const { id: batchId, teamId } = batch;
  enqueueRun(context, actor, { job: 'import', teamId, lockKey: batchLock(batchId), payload: { batchId }, trigger });
}
