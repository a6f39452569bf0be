import { JudgeRequest } from '@shared/contracts/job-runs';
import { BuildQuery, EvaluateQuery, GateQuery } from '@shared/contracts/judging';
import { Router } from 'express';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { pathText, queryOf, queryTeam } from '../http/route-parameters';
import { findProduct } from '../products/find-product';
import { presentRun } from '../queue/present-run';
import { hasEnded, waitForRun } from '../queue/wait-for-run';
import { findTeam } from '../teams/find-team';
import { decideBuildGate } from './decide-build-gate';
import { gateJunit } from './gate-junit';
import { requestJudging, requestTeamJudging } from './request-judging';
import { viewVerdicts } from './view-verdicts';

/** How long a caller who waits is kept waiting. */
const WAIT_AT_MOST_MS = 30_000;

/** Verdicts, evaluation and gate. */
export function judgingRoutes(context: Context): Router {
  const router = Router();

  router.get('/v1/products/:key/verdicts', (request, response) => {
    const actor = actorOf(request);
    const { product } = findProduct(context, actor, pathText(request, 'key'), queryTeam(request), 'results.read');
    response.json(viewVerdicts(context, product, queryOf(request, BuildQuery)));
  });

  router.post('/v1/products/:key/evaluate', async (request, response) => {
    const actor = actorOf(request);
    const { product } = findProduct(context, actor, pathText(request, 'key'), queryTeam(request), 'builds.evaluate');
    const { wait } = queryOf(request, EvaluateQuery);
    const asked = requestJudging(context, actor, product, actor.kind === 'token' ? 'token' : 'person');
    const run = wait === 'true' ? await waitForRun(context, asked.id, WAIT_AT_MOST_MS) : asked;
    response.status(hasEnded(run) ? 200 : 202).json(presentRun(run));
  });

  router.get('/v1/products/:key/gate', (request, response) => {
    const actor = actorOf(request);
    const found = findProduct(context, actor, pathText(request, 'key'), queryTeam(request), 'gate.read');
    const { hardware, firmware, format, targetMarginDb: ownTargetDb } = queryOf(request, GateQuery);
    const gate = decideBuildGate(context, found, { hardware, firmware }, ownTargetDb);
    const { key } = found.product;
    if (format === 'junit') {
      response.type('application/xml').send(gateJunit(gate, `${key} ${hardware} / ${firmware}`));
      return;
    }
    const { verdict, targetMarginDb, reasons } = gate;
    response.json({ verdict, product: key, hardware, firmware, targetMarginDb, reasons });
  });

  router.post('/teams/:team/judge', (request, response) => {
    const actor = actorOf(request);
    const team = findTeam(context, actor, pathText(request, 'team'), 'judging.start');
    const { product: key } = JudgeRequest.parse(request.body ?? {});
    const runs =
      key === undefined
        ? requestTeamJudging(context, actor, team.id)
        : [
            requestJudging(
              context,
              actor,
              findProduct(context, actor, key, team.key, 'judging.start').product,
              'person',
            ),
          ];
    response.status(202).json({ runs: runs.map(presentRun) });
  });

  return router;
}
