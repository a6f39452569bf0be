import { Router } from 'express';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { pathId, pathText } from '../http/route-parameters';
import { findTeam } from '../teams/find-team';
import { findOwnRun, listTeamRuns } from './find-runs';
import { presentRun } from './present-run';

/** Runs of jobs. */
export function runRoutes(context: Context): Router {
  const router = Router();

  router.get('/v1/runs/:id', (request, response) => {
    response.json(presentRun(findOwnRun(context, actorOf(request), pathId(request, 'id'))));
  });

  router.get('/teams/:team/jobs', (request, response) => {
    const team = findTeam(context, actorOf(request), pathText(request, 'team'), 'jobs.read');
    response.json(listTeamRuns(context, team.id).map(presentRun));
  });

  return router;
}
