import type { Role } from '@shared/access/roles';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { requireMember } from './require-member';
import { setMembership } from './set-membership';
import type { Team } from './team-store';

/** @throws ServiceError `notFound` for somebody who is not in the team; `conflict` for the last lead */
export function changeRole(context: Context, actor: Actor, team: Team, personId: number, role: Role): void {
  withTransaction(context.db, () => {
    requireMember(context, team, personId);
    setMembership(context, actor, team, personId, role);
  });
}
