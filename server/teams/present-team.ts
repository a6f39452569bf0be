import type { TeamView } from '@shared/contracts/teams';
import type { Team } from './team-store';

export function presentTeam(team: Team): TeamView {
  const { key, name, timeZone, targetMarginDb, thresholdDb, bands, isArchived } = team;
  return { key, name, timeZone, targetMarginDb, thresholdDb, bands, isArchived };
}
