import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { createPerson } from './create-person';
import { findPersonByEmail, updatePerson } from './person-store';

/** Makes the person with this e-mail an administrator with this password, with a new account where there is none. */
export function makeAdministrator(
  context: Context,
  actor: Actor,
  { email, name, passwordHash }: { email: string; name: string; passwordHash: string },
): number {
  return withTransaction(context.db, () => {
    const known = findPersonByEmail(context.db, email);
    const change = { passwordHash, isAdministrator: true, disabledAt: null };
    if (known) updatePerson(context.db, known.id, change);
    const { id } = known ?? createPerson(context, { email, name, passwordHash, isAdministrator: true });
    recordAudit(context, actor, {
      teamId: null,
      action: 'person.madeAdministrator',
      subjectKind: 'person',
      subjectId: id,
      summary: `${email} was made an administrator at the server`,
      details: {
        before: known ? { isAdministrator: known.isAdministrator, isDisabled: known.disabledAt !== null } : null,
        now: { isAdministrator: true, isDisabled: false },
      },
    });
    return id;
  });
}
