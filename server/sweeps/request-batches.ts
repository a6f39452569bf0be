import type { Context } from '../context';
import { enqueueBatch } from './enqueue-batch';
import { listOpenBatches } from './import-store';

/** Asks again for every batch that is not finished: what a restart or a fault left lying. */
export function requestOpenBatches(context: Context, trigger: 'schedule' | 'start'): void {
  const actor = { kind: 'job', name: 'import' } as const;
  for (const batch of listOpenBatches(context.db)) enqueueBatch(context, actor, batch, trigger);
}
