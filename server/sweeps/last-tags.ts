import type { BatchTags } from '@shared/contracts/imports';
import type { PersonActor } from '../actor';
import type { Context } from '../context';
import type { Team } from '../teams/team-store';
import { findLastSweepRow } from './sweep-view-store';

/** The tags of the person's last sweep in the team, without those that belong to one measurement only; null before the first. */
export function lastTags(context: Context, person: PersonActor, team: Team): BatchTags | null {
  const row = findLastSweepRow(context.db, team.id, person.personId);
  if (row === undefined) return null;
  const { sweep, product, hardware, firmware, unit, state, bench } = row;
  const { line, detector, kind, rbwHz, attenuationDb, correction } = sweep;
  return {
    product: product.key,
    hardware,
    firmware,
    ...(unit !== null && { unit }),
    state,
    bench,
    line,
    detector,
    kind,
    ...(rbwHz !== null && { rbwHz }),
    ...(attenuationDb !== null && { attenuationDb }),
    corrected: correction === 'inFile',
  };
}
