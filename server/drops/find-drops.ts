import type { DropQuery } from '@shared/contracts/drops';
import { type Actor, actorId } from '../actor';
import type { Context } from '../context';
import { type DropFilter, type DropRow, listDropsOfBuild, listNamedDrops, type NamedDrop } from './drop-store';

/** Drops of a team or product, those that need somebody first. */
export function findDrops(
  context: Context,
  actor: Actor,
  where: Pick<DropFilter, 'teamId' | 'productId'>,
  { state: states, owner }: DropQuery,
): NamedDrop[] {
  return listNamedDrops(context.db, { ...where, states, ownerId: ownerFilter(actor, owner) });
}

/** Drops of a build, in the order they were raised in. */
export function findDropsOfBuild(context: Context, buildId: number): DropRow[] {
  return listDropsOfBuild(context.db, buildId);
}

/** A token owns nothing: its "me" finds no drop. */
function ownerFilter(actor: Actor, owner: DropQuery['owner']): number | null | undefined {
  if (owner === 'nobody') return null;
  if (owner === 'me') return actor.kind === 'person' ? actorId(actor) : -1;
  return owner;
}
