import { belongsTo } from '@shared/access/may';
import type { Action } from '@shared/access/permissions';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { requirePermission } from '../require-permission';
import { ServiceError } from '../service-error';
import { findTeamById, findTeamByKey, type Team } from './team-store';

/**
 * The team with this key, if the actor may do the action in it.
 *
 * @throws ServiceError `notFound` for an unknown, archived or foreign team alike; `forbidden`
 */
export function findTeam(context: Context, actor: Actor, key: string, action: Action): Team {
  const team = findTeamByKey(context.db, key);
  if (team === undefined || team.isArchived || !belongsTo(actor, team.id)) {
    throw new ServiceError('notFound', `there is no team "${key}" for you`);
  }
  requirePermission(actor, action, team.id);
  return team;
}

/** The team with this row id, which must exist. */
export function teamById(context: Context, id: number): Team {
  const team = findTeamById(context.db, id);
  if (team === undefined) throw new Error(`team ${id} is gone`);
  return team;
}
