import type { InstallationTeam } from '@shared/contracts/teams';
import type * as z from 'zod';
import type { Context } from '../context';
import { presentTeam } from './present-team';
import { countMembers, countProducts, listTeamRows, type Team } from './team-store';

type InstallationTeamView = z.infer<typeof InstallationTeam>;

/** Every team of the installation by name, archived ones too. */
export function listTeams(context: Context): InstallationTeamView[] {
  return listTeamRows(context.db).map((team) => describeTeam(context, team));
}

export function describeTeam(context: Context, team: Team): InstallationTeamView {
  return {
    ...presentTeam(team),
    memberCount: countMembers(context.db, team.id),
    productCount: countProducts(context.db, team.id),
  };
}
