import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { findUnanswered, type Invitation } from './invitation-store';
import type { Team } from './team-store';

/** @throws ServiceError `notFound` for an invitation that is accepted, revoked, another team's or none */
export function requireUnanswered(context: Context, team: Team, id: number): Invitation {
  const invitation = findUnanswered(context.db, team.id, id);
  if (invitation === undefined) throw new ServiceError('notFound', `${team.key} has no open invitation ${id}`);
  return invitation;
}
