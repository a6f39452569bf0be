import type { Actor } from '../actor';
import type { Context } from '../context';
import { enqueueRun } from '../queue/enqueue-run';
import { listProductIds, listStaleProducts } from './stale-store';

type Run = ReturnType<typeof enqueueRun>;

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
    lockKey: `judge:${product.id}`,
    payload: { productId: product.id },
    trigger,
  });
}

/** Asks for one run per product that has a build to judge. */
export function requestStaleProducts(context: Context, trigger: 'schedule' | 'start'): void {
  for (const product of listStaleProducts(context.db)) {
    requestJudging(context, { kind: 'job', name: 'judge' }, product, trigger);
  }
}

/** Asks for one run per product of the team. */
export function requestTeamJudging(context: Context, actor: Actor, teamId: number): Run[] {
  return listProductIds(context.db, teamId).map((id) => requestJudging(context, actor, { id, teamId }, 'person'));
}
