import type { Action } from '@shared/access/permissions';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { productById, requireProduct } from '../products/find-product';
import { ServiceError } from '../service-error';
import { findNamedDrop, type NamedDrop } from './drop-store';

export interface FoundDrop extends NamedDrop {
  /** Of a product of another team, read through a share. */
  readonly isShared: boolean;
}

/**
 * The drop with this number, if the actor may do the action with its product.
 *
 * @throws ServiceError `notFound` for an unknown or foreign drop alike; `forbidden`
 */
export function findDrop(context: Context, actor: Actor, id: number, action: Action): FoundDrop {
  const found = findNamedDrop(context.db, id);
  if (found === undefined) throw new ServiceError('notFound', `there is no drop ${id} for you`);
  const isShared = requireProduct(context, actor, productById(context, found.drop.productId), action);
  return { ...found, isShared };
}
