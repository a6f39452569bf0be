import type { InvitationView } from '@shared/contracts/session';
import { personWithEmail } from '../accounts/find-person';
import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { hashSecret } from '../tokens/token-secret';
import { teamById } from './find-team';
import { findOpenInvitation, type Invitation } from './invitation-store';
import type { Team } from './team-store';

/** @throws ServiceError `notFound`, alike for a link that is mistyped, used, revoked or too old, or whose team is archived */
export function openInvitation(context: Context, secret: string): { invitation: Invitation; team: Team } {
  const invitation = findOpenInvitation(context.db, hashSecret(secret), context.now());
  const team = invitation && teamById(context, invitation.teamId);
  if (invitation === undefined || team === undefined || team.isArchived)
    throw new ServiceError(
      'notFound',
      'this invitation does not work: it is mistyped, was answered or revoked, or is older than seven days',
    );
  return { invitation, team };
}

/** What somebody with the link may know before answering. */
export function viewInvitation(context: Context, secret: string): InvitationView {
  const { invitation, team } = openInvitation(context, secret);
  const { email, role } = invitation;
  return { email, teamName: team.name, role, isKnown: personWithEmail(context, email) !== undefined };
}
