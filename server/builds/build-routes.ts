import type { Action } from '@shared/access/permissions';
import { BuildInput, BuildPatch } from '@shared/contracts/builds';
import { type Request, Router } from 'express';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { pathId, pathText, queryTeam } from '../http/route-parameters';
import { findProduct } from '../products/find-product';
import { createBuild, editBuild } from './edit-build';
import { viewBuild, viewBuilds } from './view-builds';

/** Builds of a product. */
export function buildRoutes(context: Context): Router {
  const product = (request: Request, action: Action) =>
    findProduct(context, actorOf(request), pathText(request, 'product'), queryTeam(request), action).product;

  return Router()
    .get('/v1/products/:product/builds', (request, response) => {
      response.json(viewBuilds(context, product(request, 'results.read')));
    })
    .post('/v1/products/:product/builds', (request, response) => {
      const found = product(request, 'builds.edit');
      const build = createBuild(context, actorOf(request), found, BuildInput.parse(request.body));
      response.status(201).json(viewBuild(context, found, build.id));
    })
    .get('/v1/products/:product/builds/:build', (request, response) => {
      response.json(viewBuild(context, product(request, 'results.read'), pathId(request, 'build')));
    })
    .patch('/v1/products/:product/builds/:build', (request, response) => {
      const found = product(request, 'builds.edit');
      const build = editBuild(
        context,
        actorOf(request),
        found,
        pathId(request, 'build'),
        BuildPatch.parse(request.body),
      );
      response.json(viewBuild(context, found, build.id));
    });
}
