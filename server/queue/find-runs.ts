import { belongsTo } from '@shared/access/may';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { findRun, type JobRun, listRuns } from './run-store';

/** How many runs a list shows. */
const MOST_LISTED = 200;

/** Runs of a team, newest first. */
export function listTeamRuns(context: Context, teamId: number): JobRun[] {
  return listRuns(context.db, teamId, MOST_LISTED);
}

/**
 * The run with this number, if it belongs to a team of the actor: whoever asked for one may follow it, tokens included.
 *
 * @throws ServiceError `notFound` for an unknown run, one of another team and one of the installation alike
 */
export function findOwnRun(context: Context, actor: Actor, id: number): JobRun {
  const run = findRun(context.db, id);
  if (run === undefined || run.teamId === null || !belongsTo(actor, run.teamId)) {
    throw new ServiceError('notFound', `there is no run ${id} for you`);
  }
  return run;
}
