import type { InvitationAnswer } from '@shared/contracts/session';
import type * as z from 'zod';
import { createPerson } from '../accounts/create-person';
import { personWithEmail } from '../accounts/find-person';
import { hashPassword } from '../accounts/password-hash';
import { personActor } from '../accounts/person-actor';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import { updateInvitation } from './invitation-store';
import { findMember } from './member-store';
import { openInvitation } from './open-invitation';
import { setMembership } from './set-membership';

type Answer = z.infer<typeof InvitationAnswer>;

/**
 * Joins the team of the invitation: the person with its e-mail, or somebody new with the given name and password.
 *
 * @returns the new person's id, or undefined for a known one, whom the link alone does not sign in
 * @throws ServiceError `notFound` for a link that does not work; `invalid` without name or password; `forbidden` when disabled
 */
export async function acceptInvitation(context: Context, secret: string, answer: Answer): Promise<number | undefined> {
  const { invitation } = openInvitation(context, secret);
  const newcomer = personWithEmail(context, invitation.email) ? undefined : await newcomerOf(answer);
  return withTransaction(context.db, () => {
    const { invitation, team } = openInvitation(context, secret);
    const known = personWithEmail(context, invitation.email);
    const person = known ?? (newcomer && createPerson(context, { ...newcomer, email: invitation.email }));
    const actor = person && personActor(context, person.id);
    if (actor === undefined) throw new ServiceError('forbidden', 'this account is disabled; ask an administrator');
    updateInvitation(context.db, invitation.id, { acceptedAt: context.now() });
    // Somebody an administrator has put into the team meanwhile keeps the role given there.
    if (findMember(context.db, team.id, actor.personId) === undefined)
      setMembership(context, actor, team, actor.personId, invitation.role);
    return known ? undefined : actor.personId;
  });
}

async function newcomerOf({ name, password }: Answer): Promise<{ name: string; passwordHash: string }> {
  if (name !== undefined && password !== undefined) return { name, passwordHash: await hashPassword(password) };
  const message = 'is needed for a new account';
  const errors = [
    ...(name === undefined ? [{ path: 'name', message }] : []),
    ...(password === undefined ? [{ path: 'password', message }] : []),
  ];
  throw new ServiceError('invalid', `${errors[0]?.path}: ${message}`, { errors });
}
