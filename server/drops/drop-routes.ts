import { DropMove, DropNote, DropOwner, DropQuery } from '@shared/contracts/drops';
import { Router } from 'express';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { pathId, pathText, queryOf, queryTeam } from '../http/route-parameters';
import { findProduct } from '../products/find-product';
import { findTeam } from '../teams/find-team';
import { assignDrop } from './assign-drop';
import { findDrops } from './find-drops';
import { moveDrop } from './move-drop';
import { noteDrop } from './note-drop';
import { presentDropSummary } from './present-drop';
import { viewDrop } from './view-drop';

/** Drops and their triage. */
export function dropRoutes(context: Context): Router {
  const router = Router();

  router.get('/v1/products/:key/drops', (request, response) => {
    const actor = actorOf(request);
    const { product } = findProduct(context, actor, pathText(request, 'key'), queryTeam(request), 'results.read');
    const drops = findDrops(context, actor, { productId: product.id }, queryOf(request, DropQuery));
    response.json(drops.map(presentDropSummary));
  });

  router.get('/teams/:team/drops', (request, response) => {
    const actor = actorOf(request);
    const team = findTeam(context, actor, pathText(request, 'team'), 'results.read');
    const drops = findDrops(context, actor, { teamId: team.id }, queryOf(request, DropQuery));
    response.json(drops.map(presentDropSummary));
  });

  router.get('/v1/drops/:id', (request, response) => {
    response.json(viewDrop(context, actorOf(request), pathId(request, 'id')));
  });

  router.post('/v1/drops/:id/moves', (request, response) => {
    const actor = actorOf(request);
    moveDrop(context, actor, pathId(request, 'id'), DropMove.parse(request.body));
    response.json(viewDrop(context, actor, pathId(request, 'id')));
  });

  router.put('/v1/drops/:id/owner', (request, response) => {
    const actor = actorOf(request);
    assignDrop(context, actor, pathId(request, 'id'), DropOwner.parse(request.body).personId);
    response.json(viewDrop(context, actor, pathId(request, 'id')));
  });

  router.post('/v1/drops/:id/notes', (request, response) => {
    const actor = actorOf(request);
    noteDrop(context, actor, pathId(request, 'id'), DropNote.parse(request.body).text);
    response.json(viewDrop(context, actor, pathId(request, 'id')));
  });

  return router;
}
