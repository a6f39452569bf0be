import type { Context } from '../context';
import { enqueueRun } from '../queue/enqueue-run';
import { listDueMailIds } from './outbox-store';

/** Asks for a run if some mail is due. */
export function requestDueMail(context: Context, trigger: 'schedule' | 'start'): void {
  if (listDueMailIds(context.db, context.now()).length > 0) enqueueMailRun(context, trigger);
}

export function enqueueMailRun(context: Context, trigger: 'schedule' | 'start'): void {
  enqueueRun(context, { kind: 'job', name: 'mail' }, { job: 'mail', teamId: null, lockKey: 'mail', trigger });
}
