import { isAtLeast } from '@shared/access/roles';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import { listMembers, type Member } from './assignee-store';
import { updateDrop } from './drop-store';
import { findDrop } from './find-drop';
import { recordDropEvent } from './record-drop-event';

/** Who may own a drop of the team: everybody in it who can measure or do more. */
export function assignableMembers(context: Context, teamId: number): Member[] {
  return listMembers(context.db, teamId).filter(({ role }) => isAtLeast(role, 'technician'));
}

/**
 * Gives a drop to somebody of the team, or with null to nobody. The same owner again changes nothing.
 *
 * @throws ServiceError `notFound`, `forbidden`; `invalid` when the person cannot own drops of this team
 */
export function assignDrop(context: Context, actor: Actor, dropId: number, personId: number | null): void {
  withTransaction(context.db, () => {
    const { drop } = findDrop(context, actor, dropId, 'drops.triage');
    if (drop.ownerId === personId) return;
    const owner = assignableMembers(context, drop.teamId).find(({ id }) => id === personId);
    if (personId !== null && owner === undefined) {
      throw new ServiceError('invalid', `personId: ${personId} is no technician, engineer or lead of the team`);
    }
    updateDrop(context.db, drop.id, { ownerId: personId, updatedAt: context.now() });
    const text = owner ? `Given to ${owner.name}.` : 'Given to nobody.';
    recordDropEvent(context, actor, drop, { kind: 'owner', text }, { before: drop.ownerId, now: personId });
  });
}
