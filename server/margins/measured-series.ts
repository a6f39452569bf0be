import type { Context } from '../context';
import { type CellSeriesRow, listMeasuredSeries } from './cells-store';

/** Which series (state, line, detector) a product's builds were measured in, all builds or the named ones. */
export function measuredSeries(
  context: Context,
  productId: number,
  buildIds?: readonly number[],
): Map<number, CellSeriesRow[]> {
  return listMeasuredSeries(context.db, productId, buildIds);
}
