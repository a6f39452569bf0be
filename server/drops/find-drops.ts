import { groupBy } from '@shared/collections/group-by';
import type { DropQuery } from '@shared/contracts/drops';
import { type Actor, actorId } from '../actor';
import type { Context } from '../context';
import { type DropFilter, type DropRow, listDropsById, listDropsOfBuild, listNamedDrops } from './drop-store';
import { listDropsSeenIn, listSightings } from './sighting-store';
import { compareTracedDrops, traceDrop, type TracedDrop } from './trace-drop';

/** Drops of a team or product, those that need somebody first. */
export function findDrops(
  context: Context,
  actor: Actor,
  where: Pick<DropFilter, 'teamId' | 'productId'>,
  { state: states, owner }: DropQuery,
): TracedDrop[] {
  const found = listNamedDrops(context.db, { ...where, states, ownerId: ownerFilter(actor, owner) });
  const sightings = groupBy(
    listSightings(
      context.db,
      found.map(({ drop }) => drop.id),
    ),
    ({ dropId }) => dropId,
  );
  return found.map((named) => traceDrop(named, sightings.get(named.drop.id) ?? [])).sort(compareTracedDrops);
}

/** Drops raised on a build, in the order they were raised in. */
export function findDropsOfBuild(context: Context, buildId: number): DropRow[] {
  return listDropsOfBuild(context.db, buildId);
}

/** Drops whose loss the build shows: its own, and those of other builds it goes on with. */
export function findDropsShownBy(context: Context, buildId: number): DropRow[] {
  return [...listDropsOfBuild(context.db, buildId), ...listDropsById(context.db, listDropsSeenIn(context.db, buildId))];
}

/** A token owns nothing: its "me" finds no drop. */
function ownerFilter(actor: Actor, owner: DropQuery['owner']): number | null | undefined {
  if (owner === 'nobody') return null;
  if (owner === 'me') return actor.kind === 'person' ? actorId(actor) : -1;
  return owner;
}
