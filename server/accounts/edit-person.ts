import type { PersonPatch } from '@shared/contracts/teams';
import type * as z from 'zod';
import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { endSessionsOf } from '../http/session-store';
import { ServiceError } from '../service-error';
import { findPerson } from './find-person';
import { countAdministrators, updatePerson } from './person-store';

/**
 * Makes somebody an administrator or not, disables or enables an account. A disabled person is signed out at once.
 *
 * @throws ServiceError `notFound`; `conflict` when no administrator would be left
 */
export function editPerson(context: Context, actor: Actor, id: number, patch: z.infer<typeof PersonPatch>): void {
  withTransaction(context.db, () => {
    const person = findPerson(context, id);
    const before = { isAdministrator: person.isAdministrator, isDisabled: person.disabledAt !== null };
    const now = { ...before, ...patch };
    updatePerson(context.db, id, {
      isAdministrator: now.isAdministrator,
      disabledAt: now.isDisabled ? (person.disabledAt ?? context.now()) : null,
    });
    if (countAdministrators(context.db) === 0)
      throw new ServiceError('conflict', `${person.email} is the last administrator; appoint another one first`);
    if (now.isDisabled) endSessionsOf(context.db, id);
    recordAudit(context, actor, {
      teamId: null,
      action: 'person.changed',
      subjectKind: 'person',
      subjectId: id,
      summary: `${person.name} is ${now.isDisabled ? 'disabled' : 'enabled'} and ${now.isAdministrator ? 'an' : 'no'} administrator`,
      details: { before, now },
    });
  });
}
