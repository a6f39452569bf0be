import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { endSessionsOf } from '../http/session-store';
import { ServiceError } from '../service-error';
import { hashSecret } from '../tokens/token-secret';
import { hashPassword } from './password-hash';
import { closeResetsOf, findOpenReset, type PasswordReset } from './password-reset-store';
import { personActor } from './person-actor';
import { updatePerson } from './person-store';

/**
 * Sets the password of the person the link was made for, and ends every session of theirs.
 *
 * @throws ServiceError `notFound` for a link that is mistyped, used or too old; `forbidden` for a disabled account
 */
export async function resetPassword(context: Context, secret: string, password: string): Promise<void> {
  requireOpenReset(context, secret);
  const passwordHash = await hashPassword(password);
  withTransaction(context.db, () => {
    const { personId } = requireOpenReset(context, secret);
    const actor = personActor(context, personId);
    if (actor === undefined) throw new ServiceError('forbidden', 'this account is disabled; ask an administrator');
    closeResetsOf(context.db, personId, context.now());
    updatePerson(context.db, personId, { passwordHash });
    endSessionsOf(context.db, personId);
    recordAudit(context, actor, {
      teamId: null,
      action: 'person.passwordReset',
      subjectKind: 'person',
      subjectId: personId,
      summary: `${actor.name} set a new password by e-mail link`,
    });
  });
}

function requireOpenReset(context: Context, secret: string): PasswordReset {
  const reset = findOpenReset(context.db, hashSecret(secret), context.now());
  if (reset === undefined)
    throw new ServiceError('notFound', 'this link does not work: it is mistyped, was used already or is too old');
  return reset;
}
