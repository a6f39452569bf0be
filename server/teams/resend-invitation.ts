import type { PersonActor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { hashSecret, newSecret } from '../tokens/token-secret';
import { mailInvitation } from './invitation-mail';
import { type Invitation, updateInvitation } from './invitation-store';
import { INVITATION_VALID_MS } from './invite-member';
import { requireUnanswered } from './require-unanswered';
import type { Team } from './team-store';

/** Mails an unanswered invitation again with a new link for seven days; the old link ends. @throws ServiceError `notFound` */
export function resendInvitation(context: Context, actor: PersonActor, team: Team, id: number): Invitation {
  return withTransaction(context.db, () => {
    const { email, expiresAt } = requireUnanswered(context, team, id);
    const secret = newSecret();
    const invitation = updateInvitation(context.db, id, {
      tokenHash: hashSecret(secret),
      expiresAt: context.now() + INVITATION_VALID_MS,
    });
    mailInvitation(context, { team, invitation, secret, inviter: actor.name });
    recordAudit(context, actor, {
      teamId: team.id,
      action: 'invitation.sentAgain',
      subjectKind: 'invitation',
      subjectId: id,
      summary: `The invitation of ${email} was sent again`,
      details: { before: { expiresAt }, now: { expiresAt: invitation.expiresAt } },
    });
    return invitation;
  });
}
