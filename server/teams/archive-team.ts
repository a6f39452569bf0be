import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import { findTeamByKey, type Team, updateTeam } from './team-store';

/** Hides a team from everybody, its data kept, or brings it back. @throws ServiceError `notFound` */
export function archiveTeam(context: Context, actor: Actor, key: string, isArchived: boolean): Team {
  return withTransaction(context.db, () => {
    const team = findTeamByKey(context.db, key);
    if (team === undefined) throw new ServiceError('notFound', `there is no team "${key}"`);
    if (team.isArchived === isArchived) return team;
    recordAudit(context, actor, {
      teamId: team.id,
      action: isArchived ? 'team.archived' : 'team.restored',
      subjectKind: 'team',
      subjectId: team.id,
      summary: `Team ${team.key} was ${isArchived ? 'archived' : 'restored'}`,
      details: { before: { isArchived: team.isArchived }, now: { isArchived } },
    });
    return updateTeam(context.db, team.id, { isArchived });
  });
}
