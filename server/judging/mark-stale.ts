import type { Context } from '../context';
import { raiseDataVersions } from './stale-store';

/**
 * Says that what the product's builds are judged on has changed from a position on: sweeps came in or went, or the
 * reference was chosen anew. The job judges them again. Builds without a sweep stay as they are.
 *
 * @param fromPosition position of the first build concerned; earlier builds never depend on later ones
 */
export function markStale(context: Context, productId: number, fromPosition: number): void {
  raiseDataVersions(context.db, productId, fromPosition);
}
