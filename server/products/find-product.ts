import { belongsTo, may } from '@shared/access/may';
import type { Action } from '@shared/access/permissions';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { requirePermission } from '../require-permission';
import { ServiceError } from '../service-error';
import { teamById } from '../teams/find-team';
import { findProductById, findReachableProducts, type Product, type ProductOfTeam, listShares } from './product-store';

export interface FoundProduct extends ProductOfTeam {
  /** Owned by another team and read through a share. */
  readonly isShared: boolean;
}

/**
 * The product with this key, if the actor may do the action with it. Reading results also works for a product shared
 * with one of the actor's teams; everything else only in the owning team.
 *
 * @param ownerKey key of the owning team, needed only when several reachable products have the key
 * @throws ServiceError `notFound` for an unknown or foreign product alike; `forbidden`; `invalid` when the key is ambiguous
 */
export function findProduct(
  context: Context,
  actor: Actor,
  key: string,
  ownerKey: string | undefined,
  action: Action,
): FoundProduct {
  const reachable = findReachableProducts(context.db, key, teamsOf(actor));
  const named = ownerKey === undefined ? reachable : reachable.filter(({ team }) => team.key === ownerKey);
  const own = named.filter(({ team }) => teamsOf(actor).includes(team.id));
  const candidates = own.length > 0 ? own : named;
  const [found, second] = candidates;
  if (found === undefined) {
    const where = ownerKey === undefined ? '' : ` in team "${ownerKey}"`;
    throw new ServiceError('notFound', `there is no product "${key}"${where} for you`);
  }
  if (second !== undefined) {
    const names = candidates.map(({ team }) => team.key).join(', ');
    throw new ServiceError('invalid', `several teams have a product "${key}" (${names}): name one with team=`);
  }
  const isShared = requireProduct(context, actor, found.product, action, `there is no product "${key}" for you`);
  return { ...found, isShared };
}

/**
 * Stops an actor who may not do the action with the product, whatever way it was found.
 *
 * @param missing what somebody is told who must not learn that there is such a thing
 * @returns whether the product is read through a share
 */
export function requireProduct(
  context: Context,
  actor: Actor,
  product: Product,
  action: Action,
  missing: string,
): boolean {
  if (may(actor, action, product.teamId)) return false;
  if (action === 'results.read' && isReadThroughShare(context, actor, product)) return true;
  if (action !== 'results.read' && isReadThroughShare(context, actor, product)) {
    throw new ServiceError('forbidden', `the product "${product.key}" is shared with your team to read only`);
  }
  if (!belongsTo(actor, product.teamId)) throw new ServiceError('notFound', missing);
  requirePermission(actor, action, product.teamId);
  return false;
}

/** The product with this row id, which must exist. */
export function productById(context: Context, id: number): Product {
  const product = findProductById(context.db, id);
  if (product === undefined) throw new Error(`product ${id} is gone`);
  return product;
}

/** A share ends when the team that gave it is archived. */
function isReadThroughShare(context: Context, actor: Actor, product: Product): boolean {
  if (teamById(context, product.teamId).isArchived) return false;
  return listShares(context.db, product.id).some((team) => may(actor, 'results.read', team.id));
}

function teamsOf(actor: Actor): number[] {
  switch (actor.kind) {
    case 'person':
      return [...actor.roles.keys()];
    case 'token':
      return [actor.teamId];
    case 'job':
      return [];
  }
}
