import type { Action } from '@shared/access/permissions';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { requireProduct } from '../products/find-product';
import { ServiceError } from '../service-error';
import { findSweepRow, type SweepRow } from './sweep-view-store';

export type { SweepRow };

/**
 * The sweep with this number, if the actor may do the action with its product.
 *
 * @throws ServiceError `notFound` for an unknown and a foreign sweep alike; `forbidden`
 */
export function findSweep(context: Context, actor: Actor, id: number, action: Action): SweepRow {
  const missing = `there is no sweep ${id} for you`;
  const row = findSweepRow(context.db, id);
  if (row === undefined) throw new ServiceError('notFound', missing);
  requireProduct(context, actor, row.product, action, missing);
  return row;
}

/** The sweep with this row id, which must exist. */
export function sweepById(context: Context, id: number): SweepRow {
  const row = findSweepRow(context.db, id);
  if (row === undefined) throw new Error(`sweep ${id} is gone`);
  return row;
}
