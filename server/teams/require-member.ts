import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { findMember, type Member } from './member-store';
import type { Team } from './team-store';

/** @throws ServiceError `notFound` for somebody who is not in the team */
export function requireMember(context: Context, team: Team, personId: number): Member {
  const member = findMember(context.db, team.id, personId);
  if (member === undefined) throw new ServiceError('notFound', `person ${personId} is not in ${team.key}`);
  return member;
}
