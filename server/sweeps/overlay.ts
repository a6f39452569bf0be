import { groupBy } from '@shared/collections/group-by';
import { OVERLAY_MOST_TRACES } from '@shared/contracts/overlay-most-traces';
import type { OverlayQuery, OverlayTrace } from '@shared/contracts/sweeps';
import type { Frames } from '@shared/traces/frames';
import type { Context } from '../context';
import type { FoundProduct } from '../products/find-product';
import { ServiceError } from '../service-error';
import type { SweepRow } from './find-sweep';
import { frameSweeps } from './frame-sweeps';
import { listBackgroundsLike, listCandidates, type OverlayCandidate } from './overlay-store';
import { listSweepRows } from './sweep-view-store';

/** Sweeps no further apart belong to one day at the bench. */
const SAME_DAY_MS = 12 * 3600_000;

/**
 * Traces of sweeps and builds of one product over their limits.
 *
 * @throws ServiceError `notFound` for a sweep that is not the product's; `invalid` for more traces than one picture holds
 */
export function overlay(context: Context, found: FoundProduct, query: OverlayQuery): Frames<OverlayTrace> {
  const { sweeps = [], builds = [], ...filter } = query;
  const picked = pickOfBuilds(listCandidates(context.db, found.product.id, builds, filter));
  const ids = [...new Set([...sweeps, ...picked])];
  const rows = rowsOf(context, found, ids);
  if (query.kind === 'background') rows.push(...backgroundRows(context, found, rows));
  return frameSweeps(context, rows);
}

/** Of every build and series the newest run, and of that run the sweep with the least margin. */
function pickOfBuilds(candidates: readonly OverlayCandidate[]): number[] {
  const series = groupBy(candidates, ({ buildId, stateId, line, detector }) =>
    [buildId, stateId, line, detector].join(' '),
  );
  return [...series.values()].map((sweeps) => {
    const newest = sweeps.reduce((latest, sweep) => (sweep.takenAt > latest.takenAt ? sweep : latest));
    const run = sweeps.filter((sweep) => sweep.run === newest.run);
    return run.reduce((worst, sweep) => (marginOf(sweep) < marginOf(worst) ? sweep : worst)).id;
  });
}

function marginOf({ worstMarginDb }: OverlayCandidate): number {
  return worstMarginDb ?? Infinity;
}

function rowsOf(context: Context, { product }: FoundProduct, ids: readonly number[]): SweepRow[] {
  if (ids.length > OVERLAY_MOST_TRACES) {
    throw new ServiceError(
      'invalid',
      `an overlay holds ${OVERLAY_MOST_TRACES} traces, these are ${ids.length}: choose a state, a line or a detector`,
    );
  }
  const rows = new Map(
    listSweepRows(context.db, { productId: product.id, ids }, ids.length).map((row) => [row.sweep.id, row]),
  );
  // Evidence names sweeps that may have been removed since; the others are still worth seeing.
  const present = ids.flatMap((id) => rows.get(id) ?? []);
  if (ids.length > 0 && present.length === 0) {
    throw new ServiceError('notFound', `sweeps: ${ids.join(', ')} is no sweep of "${product.key}"`);
  }
  return present;
}

/** The background nearest in time to each sweep, on the same bench and day; through a share only the product's own. */
function backgroundRows(context: Context, { product, isShared }: FoundProduct, rows: readonly SweepRow[]): SweepRow[] {
  const nearest = rows.flatMap(({ sweep }) => {
    const { takenAt } = sweep;
    const own = isShared ? product.id : undefined;
    return listBackgroundsLike(context.db, sweep, takenAt - SAME_DAY_MS, takenAt + SAME_DAY_MS, own)
      .sort((a, b) => Math.abs(a.takenAt - takenAt) - Math.abs(b.takenAt - takenAt))
      .slice(0, 1);
  });
  const ids = [...new Set(nearest.map(({ id }) => id))];
  return listSweepRows(context.db, { ids }, ids.length);
}
