import type { Context } from '../context';
import type { BuildRecord } from './build-record';
import { markStale } from './mark-stale';
import { buildsOfTheDay } from './same-day-guard';
import { listChangedBuilds } from './same-day-store';

/**
 * Lets changed builds of other products be judged again when new sweeps of this one, from the same bench and day, can
 * tell whether it was the bench that moved. Called only for new sweeps, so that two products never keep each other going.
 */
export function rejudgeNeighbours(context: Context, record: BuildRecord): void {
  for (const { productId, position } of listChangedBuilds(context.db, buildsOfTheDay(context, record))) {
    markStale(context, productId, position);
  }
}
