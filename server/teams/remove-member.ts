import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { requireLeadLeft } from './last-lead-policy';
import { countLeads, deleteMembership } from './member-store';
import { requireMember } from './require-member';
import type { Team } from './team-store';

/** Takes a person out of the team, who keeps the account. @throws ServiceError `notFound`; `conflict` for the last lead */
export function removeMember(context: Context, actor: Actor, team: Team, personId: number): void {
  withTransaction(context.db, () => {
    const { name, role } = requireMember(context, team, personId);
    deleteMembership(context.db, team.id, personId);
    if (role === 'lead') requireLeadLeft(team, countLeads(context.db, team.id));
    recordAudit(context, actor, {
      teamId: team.id,
      action: 'member.removed',
      subjectKind: 'person',
      subjectId: personId,
      summary: `${name} left the team`,
      details: { before: { role }, now: null },
    });
  });
}
