import type { PersonActor } from '../actor';
import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { findTeam } from './find-team';
import { findTeamByKey, type Team } from './team-store';

/** The team with this key, for its leads and for administrators, who manage the people of every team. */
export function findManagedTeam(context: Context, actor: PersonActor, key: string): Team {
  if (!actor.isAdministrator) return findTeam(context, actor, key, 'members.manage');
  const team = findTeamByKey(context.db, key);
  if (team === undefined || team.isArchived) throw new ServiceError('notFound', `there is no team "${key}"`);
  return team;
}
