import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { updateInvitation } from './invitation-store';
import { requireUnanswered } from './require-unanswered';
import type { Team } from './team-store';

/** Takes an unanswered invitation back; its link ends. @throws ServiceError `notFound` */
export function revokeInvitation(context: Context, actor: Actor, team: Team, id: number): void {
  withTransaction(context.db, () => {
    const { email, role } = requireUnanswered(context, team, id);
    updateInvitation(context.db, id, { revokedAt: context.now() });
    recordAudit(context, actor, {
      teamId: team.id,
      action: 'invitation.revoked',
      subjectKind: 'invitation',
      subjectId: id,
      summary: `The invitation of ${email} was revoked`,
      details: { before: { email, role }, now: null },
    });
  });
}
