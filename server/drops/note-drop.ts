import type { Actor } from '../actor';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { updateDrop } from './drop-store';
import { findDrop } from './find-drop';
import { recordDropEvent } from './record-drop-event';

/** Adds a note to the drop's history. @throws ServiceError `notFound`, `forbidden` */
export function noteDrop(context: Context, actor: Actor, dropId: number, text: string): void {
  withTransaction(context.db, () => {
    const { drop } = findDrop(context, actor, dropId, 'drops.triage');
    updateDrop(context.db, drop.id, { updatedAt: context.now() });
    recordDropEvent(context, actor, drop, { kind: 'note', text });
  });
}
