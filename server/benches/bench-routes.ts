import { BenchInput, BenchPatch } from '@shared/contracts/benches';
import { Router } from 'express';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { pathText } from '../http/route-parameters';
import { findTeam } from '../teams/find-team';
import { changeBench } from './change-bench';
import { createBench } from './create-bench';
import { findBench } from './find-bench';
import { listBenches, withUse } from './list-benches';
import { presentBench } from './present-bench';

/** Benches of a team. */
export function benchRoutes(context: Context): Router {
  return Router()
    .get('/teams/:team/benches', (request, response) => {
      const team = findTeam(context, actorOf(request), pathText(request, 'team'), 'results.read');
      response.json(listBenches(context, team.id).map(presentBench));
    })
    .post('/teams/:team/benches', (request, response) => {
      const actor = actorOf(request);
      const team = findTeam(context, actor, pathText(request, 'team'), 'benches.edit');
      const bench = createBench(context, actor, team.id, BenchInput.parse(request.body));
      response.status(201).json(presentBench(withUse(context, bench)));
    })
    .patch('/teams/:team/benches/:bench', (request, response) => {
      const actor = actorOf(request);
      const team = findTeam(context, actor, pathText(request, 'team'), 'benches.edit');
      const bench = findBench(context, team.id, pathText(request, 'bench'));
      const changed = changeBench(context, actor, bench, BenchPatch.parse(request.body));
      response.json(presentBench(withUse(context, changed)));
    });
}
