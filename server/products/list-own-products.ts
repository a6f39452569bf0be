import type { ProductSummary } from '@shared/contracts/products';
import type { Context } from '../context';
import { listReachableProducts } from './product-store';
import { summariseProduct } from './summarise-product';

/** The products a team owns, by name. */
export function listOwnProducts(context: Context, teamId: number): { id: number; summary: ProductSummary }[] {
  return listReachableProducts(context.db, [teamId])
    .filter(({ team }) => team.id === teamId)
    .map((found) => ({ id: found.product.id, summary: summariseProduct(context, found, false) }));
}
