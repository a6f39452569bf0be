import type { Context } from '../context';
import { measuredSeries } from '../margins/measured-series';
import { listStates } from './state-store';

/** Required operating states without a product sweep, by build; a build with none missing has an empty list. */
export function unmeasuredStates(
  context: Context,
  productId: number,
  buildIds: readonly number[],
): Map<number, string[]> {
  const required = listStates(context.db, productId).filter((state) => state.isRequired);
  const measured = measuredSeries(context, productId, buildIds);
  return new Map(
    buildIds.map((buildId) => {
      const states = new Set(measured.get(buildId)?.map(({ stateId }) => stateId));
      return [buildId, required.filter((state) => !states.has(state.id)).map((state) => state.name)];
    }),
  );
}
