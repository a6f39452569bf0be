import type { Action } from '@shared/access/permissions';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { productById, requireProduct } from '../products/find-product';
import { ServiceError } from '../service-error';
import { findNamedDrop } from './drop-store';
import { listSightings } from './sighting-store';
import { traceDrop, type TracedDrop } from './trace-drop';

/**
 * The drop with this number, if the actor may do the action with its product.
 *
 * @throws ServiceError `notFound` for an unknown or foreign drop alike; `forbidden`
 */
export function findDrop(context: Context, actor: Actor, id: number, action: Action): TracedDrop {
  const missing = `there is no drop ${id} for you`;
  const found = findNamedDrop(context.db, id);
  if (found === undefined) throw new ServiceError('notFound', missing);
  requireProduct(context, actor, productById(context, found.drop.productId), action, missing);
  return traceDrop(found, listSightings(context.db, [id]));
}
