import type { PersonView } from '@shared/contracts/teams';
import type { Context } from '../context';
import { isoTime } from '../iso-time';
import { listMembershipsOfAll, listPersonRows } from './person-store';

/** Everybody with an account and their teams, by name. */
export function listPeople(context: Context): PersonView[] {
  const memberships = listMembershipsOfAll(context.db);
  return listPersonRows(context.db).map(({ id, name, email, isAdministrator, disabledAt, createdAt }) => ({
    id,
    name,
    email,
    isAdministrator,
    isDisabled: disabledAt !== null,
    createdAt: isoTime(createdAt),
    memberships: memberships
      .filter(({ personId }) => personId === id)
      .map(({ team, teamName, role }) => ({ team, teamName, role })),
  }));
}
