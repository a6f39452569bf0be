import type { Role } from '@shared/access/roles';
import { personWithEmail } from '../accounts/find-person';
import type { PersonActor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import { hashSecret, newSecret } from '../tokens/token-secret';
import { mailInvitation } from './invitation-mail';
import { findUnansweredFor, insertInvitation, type Invitation } from './invitation-store';
import { findMember } from './member-store';
import type { Team } from './team-store';

export const INVITATION_VALID_MS = 7 * 24 * 3600_000;

/**
 * Invites somebody into the team by e-mail, with an account on this installation or without.
 *
 * @throws ServiceError `conflict` for a member and for somebody whose invitation is not answered yet
 */
export function inviteMember(
  context: Context,
  actor: PersonActor,
  team: Team,
  { email, role }: { email: string; role: Role },
): Invitation {
  return withTransaction(context.db, () => {
    const person = personWithEmail(context, email);
    if (person && findMember(context.db, team.id, person.id))
      throw new ServiceError('conflict', `email: ${email} is in the team already`);
    if (findUnansweredFor(context.db, team.id, email))
      throw new ServiceError(
        'conflict',
        `email: ${email} is invited already; send that invitation again, or revoke it`,
      );
    const secret = newSecret();
    const createdAt = context.now();
    const invitation = insertInvitation(context.db, {
      teamId: team.id,
      email,
      role,
      tokenHash: hashSecret(secret),
      invitedBy: actor.personId,
      createdAt,
      expiresAt: createdAt + INVITATION_VALID_MS,
    });
    mailInvitation(context, { team, invitation, secret, inviter: actor.name });
    recordAudit(context, actor, {
      teamId: team.id,
      action: 'invitation.sent',
      subjectKind: 'invitation',
      subjectId: invitation.id,
      summary: `${email} was invited as ${role}`,
      details: { now: { email, role } },
    });
    return invitation;
  });
}
