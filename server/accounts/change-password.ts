import type { PersonActor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { endSessionsOf } from '../http/session-store';
import { ServiceError } from '../service-error';
import { findPerson } from './find-person';
import { hashPassword, isPassword } from './password-hash';
import { closeResetsOf } from './password-reset-store';
import { updatePerson } from './person-store';

/**
 * Changes one's own password and ends every session of one's own, the present one too.
 *
 * @throws ServiceError `invalid` when the current password is wrong
 */
export async function changePassword(
  context: Context,
  actor: PersonActor,
  { current, next }: { current: string; next: string },
): Promise<void> {
  const { personId } = actor;
  if (!(await isPassword(current, findPerson(context, personId).passwordHash))) {
    const message = 'is not your current password';
    throw new ServiceError('invalid', `current: ${message}`, { errors: [{ path: 'current', message }] });
  }
  const passwordHash = await hashPassword(next);
  withTransaction(context.db, () => {
    updatePerson(context.db, personId, { passwordHash });
    closeResetsOf(context.db, personId, context.now());
    endSessionsOf(context.db, personId);
    recordAudit(context, actor, {
      teamId: null,
      action: 'person.passwordChanged',
      subjectKind: 'person',
      subjectId: personId,
      summary: `${actor.name} changed their password`,
    });
  });
}
