import type { Actor } from '../actor';
import type { Context } from '../context';
import { enqueueRun } from '../queue/enqueue-run';
import { latestRuns } from '../queue/latest-run';
import { listProductIds, listStaleBuilds, listStaleProducts } from './stale-store';

type Run = ReturnType<typeof enqueueRun>;

/** A build that could not be judged so often in a row within so long is left in peace until that time is over. */
const MOST_TRIES = 3;
const TRIED_WITHIN_MS = 3600_000;

/** Asks for the judging of what is not yet judged of one product; a run that waits already serves. */
export function requestJudging(
  context: Context,
  actor: Actor,
  product: { id: number; teamId: number },
  trigger: Run['trigger'],
): Run {
  return enqueueRun(context, actor, {
    job: 'judge',
    teamId: product.teamId,
    lockKey: lockOf(product.id),
    payload: { productId: product.id },
    trigger,
  });
}

/** Asks for one run per product that has a build to judge, but for builds that failed again and again a moment ago. */
export function requestStaleProducts(context: Context, trigger: 'schedule' | 'start'): void {
  for (const product of listStaleProducts(context.db)) {
    // After a start the program may be another one.
    if (trigger === 'schedule' && isPutOff(context, product.id)) continue;
    requestJudging(context, { kind: 'job', name: 'judge' }, product, trigger);
  }
}

/** Whether every build that waits failed in each of the last runs, all of them lately. */
function isPutOff(context: Context, productId: number): boolean {
  const runs = latestRuns(context, lockOf(productId), MOST_TRIES);
  const since = context.now() - TRIED_WITHIN_MS;
  const failedIn = (run: Run, build: string) =>
    run.finishedAt !== null &&
    run.finishedAt > since &&
    (run.status === 'failed' || run.errors.some(({ subject }) => subject === build));
  return (
    runs.length === MOST_TRIES &&
    listStaleBuilds(context.db, productId).every(({ hardware, firmware }) =>
      runs.every((run) => failedIn(run, `${hardware} / ${firmware}`)),
    )
  );
}

function lockOf(productId: number): string {
  return `judge:${productId}`;
}

/** Asks for one run per product of the team. */
export function requestTeamJudging(context: Context, actor: Actor, teamId: number): Run[] {
  return listProductIds(context.db, teamId).map((id) => requestJudging(context, actor, { id, teamId }, 'person'));
}
