import { SeriesFilter, TrendQuery } from '@shared/contracts/margins';
import { type Request, Router } from 'express';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { pathText, queryTeam } from '../http/route-parameters';
import { findProduct, type FoundProduct } from '../products/find-product';
import { stateNamed } from '../products/state-named';
import { marginMap } from './margin-map';
import { trend } from './trend';
import type { SeriesChoice } from './trend-store';

/** Read models: trend and margin map. */
export function marginRoutes(context: Context): Router {
  const product = (request: Request) =>
    findProduct(context, actorOf(request), pathText(request, 'product'), queryTeam(request), 'results.read');

  return Router()
    .get('/v1/products/:product/trend', (request, response) => {
      const found = product(request);
      const { band, ...filter } = TrendQuery.parse(request.query);
      response.json(trend(context, found, choice(context, found, filter), band));
    })
    .get('/v1/products/:product/margin-map', (request, response) => {
      const found = product(request);
      response.json(marginMap(context, found, choice(context, found, SeriesFilter.parse(request.query))));
    });
}

/** The filter with the state's name looked up. @throws ServiceError `invalid` for an unknown state */
function choice(context: Context, { product }: FoundProduct, filter: SeriesFilter): SeriesChoice {
  const { state, ...rest } = filter;
  return state === undefined ? rest : { ...rest, stateId: stateNamed(context, product, state).id };
}
