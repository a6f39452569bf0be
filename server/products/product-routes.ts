import {
  ProductInput,
  ProductPatch,
  ProductShares,
  ReferenceChoice,
  StateInput,
  StatePatch,
} from '@shared/contracts/products';
import type { Action } from '@shared/access/permissions';
import { type Request, Router } from 'express';
import type { Context } from '../context';
import { actorOf, personOf } from '../http/actor-of';
import { pathId, pathText, queryTeam } from '../http/route-parameters';
import { ServiceError } from '../service-error';
import { findTeam } from '../teams/find-team';
import { chooseReference } from './choose-reference';
import { createProduct, editProduct } from './edit-product';
import { createState, editState } from './edit-state';
import { findProduct, type FoundProduct } from './find-product';
import { listProducts } from './list-products';
import { shareProduct } from './share-product';
import { presentState, viewProduct } from './view-product';

/** Products, their states, reference and shares. */
export function productRoutes(context: Context): Router {
  const found = (request: Request, action: Action): FoundProduct =>
    findProduct(context, actorOf(request), pathText(request, 'product'), queryTeam(request), action);
  const view = (request: Request) => viewProduct(context, found(request, 'results.read'));

  return Router()
    .get('/v1/products', (request, response) => {
      response.json(listProducts(context, actorOf(request), queryTeam(request)));
    })
    .post('/v1/products', (request, response) => {
      const actor = actorOf(request);
      const teamKey = queryTeam(request);
      if (teamKey === undefined) throw new ServiceError('invalid', 'team: name the team the product is for');
      const team = findTeam(context, actor, teamKey, 'products.edit');
      const product = createProduct(context, actor, team, ProductInput.parse(request.body));
      response.status(201).json(viewProduct(context, { product, team, isShared: false }));
    })
    .get('/v1/products/:product', (request, response) => {
      response.json(view(request));
    })
    .patch('/v1/products/:product', (request, response) => {
      editProduct(context, actorOf(request), found(request, 'products.edit'), ProductPatch.parse(request.body));
      response.json(view(request));
    })
    .put('/v1/products/:product/reference', (request, response) => {
      const product = found(request, 'references.choose');
      chooseReference(context, personOf(request), product, ReferenceChoice.parse(request.body));
      response.json(view(request));
    })
    .put('/v1/products/:product/shares', (request, response) => {
      const product = found(request, 'products.share');
      shareProduct(context, personOf(request), product, ProductShares.parse(request.body).teams);
      response.json(view(request));
    })
    .post('/v1/products/:product/states', (request, response) => {
      const { product } = found(request, 'products.edit');
      response
        .status(201)
        .json(presentState(createState(context, actorOf(request), product, StateInput.parse(request.body))));
    })
    .patch('/v1/products/:product/states/:state', (request, response) => {
      const { product } = found(request, 'products.edit');
      const values = StatePatch.parse(request.body);
      response.json(presentState(editState(context, actorOf(request), product, pathId(request, 'state'), values)));
    });
}
