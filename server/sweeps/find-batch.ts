import type { Context } from '../context';
import { latestRun } from '../queue/latest-run';
import type { JobRun } from '../queue/run-store';
import { ServiceError } from '../service-error';
import type { Team } from '../teams/team-store';
import { batchLock } from './enqueue-batch';
import {
  countItems,
  findNamedBatch,
  type ItemResult,
  type ItemStatus,
  listItemResults,
  listNamedBatches,
  type NamedBatch,
} from './import-store';

/** A batch with how far it has come. */
export interface BatchProgress extends NamedBatch {
  counts: ReadonlyMap<ItemStatus, number>;
  run: JobRun | undefined;
  /** Empty where only the progress was asked for. */
  items: ItemResult[];
}

/** How many batches a list shows. */
const MOST_LISTED = 20;

/** @throws ServiceError `notFound` for a batch of another team as for none */
export function findBatch(context: Context, team: Team, id: number): BatchProgress {
  const named = findNamedBatch(context.db, team.id, id);
  if (named === undefined) throw new ServiceError('notFound', `there is no import ${id} in this team`);
  return progressOf(context, named, listItemResults(context.db, id));
}

/** The newest batches of a team. */
export function listBatches(context: Context, team: Team): BatchProgress[] {
  return listNamedBatches(context.db, team.id, MOST_LISTED).map((named) => progressOf(context, named, []));
}

function progressOf(context: Context, named: NamedBatch, items: ItemResult[]): BatchProgress {
  const { id } = named.batch;
  return {
    ...named,
    counts: countItems(context.db, id),
    run: latestRun(context, batchLock(id)),
    items,
  };
}
