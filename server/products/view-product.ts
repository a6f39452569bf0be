import type { ProductView, StateView } from '@shared/contracts/products';
import { findBuild } from '../builds/find-build';
import type { Context } from '../context';
import { isoTime } from '../iso-time';
import { measuredSeries } from '../margins/measured-series';
import type { FoundProduct } from './find-product';
import { latestReferenceChoice, listShares, type Product } from './product-store';
import { listStates, listUnits, type OperatingState } from './state-store';
import { summariseProduct } from './summarise-product';

/** Everything the pages need to know of one product. */
export function viewProduct(context: Context, found: FoundProduct): ProductView {
  const { product } = found;
  const {
    trend: _trend,
    previousWorstMarginDb: _previous,
    ...summary
  } = summariseProduct(context, found, found.isShared);
  const series = [...measuredSeries(context, product.id).values()].flat();
  return {
    ...summary,
    description: product.description,
    ownTargetMarginDb: product.targetMarginDb,
    states: listStates(context.db, product.id).map(presentState),
    units: listUnits(context.db, product.id).map(({ serial }) => serial),
    lines: [...new Set(series.map(({ line }) => line))],
    detectors: [...new Set(series.map(({ detector }) => detector))],
    reference: presentReference(context, product),
    sharedWith: found.isShared
      ? []
      : listShares(context.db, product.id).map(({ key, name }) => ({ team: key, teamName: name })),
  };
}

export function presentState(state: OperatingState): StateView {
  const { id, name, supplyVoltageV, supplyFrequencyHz, load, mode, isRequired } = state;
  return { id, name, supplyVoltageV, supplyFrequencyHz, load, mode, isRequired };
}

function presentReference(context: Context, product: Product): ProductView['reference'] {
  const choice = latestReferenceChoice(context.db, product.id);
  if (product.referenceBuildId === null || choice === undefined) return null;
  const { build, hardware, firmware } = findBuild(context, product.id, product.referenceBuildId);
  const { chosenBy, chosenAt, reason } = choice;
  return { buildId: build.id, hardware, firmware, chosenBy, chosenAt: isoTime(chosenAt), reason };
}
