import type { Role } from '@shared/access/roles';
import { findPerson } from '../accounts/find-person';
import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { requireLeadLeft } from './last-lead-policy';
import { countLeads, findMember, upsertMembership } from './member-store';
import type { Team } from './team-store';

/**
 * Gives a person a role in the team, as a new member or instead of the present role.
 *
 * @throws ServiceError `notFound` for an unknown person; `conflict` when the team would lose its last lead
 */
export function setMembership(context: Context, actor: Actor, team: Team, personId: number, role: Role): void {
  withTransaction(context.db, () => {
    const person = findPerson(context, personId);
    const member = findMember(context.db, team.id, personId);
    if (member?.role === role) return;
    upsertMembership(context.db, { teamId: team.id, personId, role, createdAt: context.now() });
    if (member?.role === 'lead') requireLeadLeft(team, countLeads(context.db, team.id));
    recordAudit(context, actor, {
      teamId: team.id,
      action: member ? 'member.roleChanged' : 'member.added',
      subjectKind: 'person',
      subjectId: personId,
      summary: member
        ? `${person.name} is ${role} now, was ${member.role}`
        : `${person.name} joined the team as ${role}`,
      details: { before: member ? { role: member.role } : null, now: { role } },
    });
  });
}
