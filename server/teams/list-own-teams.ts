import type { SessionTeam } from '@shared/contracts/session';
import type { PersonActor } from '../actor';
import type { Context } from '../context';
import { listTeamsById } from './team-store';

/** The teams a person belongs to, by name, with the role there; archived ones left out. */
export function listOwnTeams(context: Context, actor: PersonActor): SessionTeam[] {
  return listTeamsById(context.db, [...actor.roles.keys()]).flatMap(({ id, key, name, timeZone, targetMarginDb }) => {
    const role = actor.roles.get(id);
    return role === undefined ? [] : [{ key, name, role, timeZone, targetMarginDb }];
  });
}
