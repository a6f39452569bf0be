import { type Actor, actorColumns } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { type DropRow, insertDropEvent, type NewDropEvent } from './drop-store';

/** Name of each kind of event in the audit log. */
const AUDITED: Record<NewDropEvent['kind'], string> = {
  raised: 'drop.raised',
  moved: 'drop.moved',
  owner: 'drop.assigned',
  note: 'drop.noted',
  evidence: 'drop.updated',
  withdrawn: 'drop.withdrawn',
};

/** Writes a line into the drop's history and the audit log; call it in the transaction of the change it tells of. */
export function recordDropEvent(
  context: Context,
  actor: Actor,
  drop: Pick<DropRow, 'id' | 'teamId'>,
  event: Pick<NewDropEvent, 'kind' | 'text'>,
  details: Record<string, unknown> = {},
): void {
  const { actorKind, actorName } = actorColumns(actor);
  insertDropEvent(context.db, { ...event, dropId: drop.id, at: context.now(), actorKind, actorName });
  recordAudit(context, actor, {
    teamId: drop.teamId,
    action: AUDITED[event.kind],
    subjectKind: 'drop',
    subjectId: drop.id,
    summary: event.text,
    details,
  });
}
