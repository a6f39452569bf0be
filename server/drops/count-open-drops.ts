import type { Context } from '../context';
import { countOpenByBuild, countOpenByProduct } from './drop-store';

type Counted = { readonly productIds: readonly number[] } | { readonly buildIds: readonly number[] };

/** Open drops by product or by build; those without any are absent. */
export function countOpenDrops(context: Context, counted: Counted): Map<number, number> {
  return 'productIds' in counted
    ? countOpenByProduct(context.db, counted.productIds)
    : countOpenByBuild(context.db, counted.buildIds);
}
