import { SeriesFilter, TrendQuery } from '@shared/contracts/margins';
import { type Request, Router } from 'express';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { pathText, queryOf, queryTeam } from '../http/route-parameters';
import { findProduct, type FoundProduct } from '../products/find-product';
import { stateNamed } from '../products/state-named';
import { ServiceError } from '../service-error';
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
      const { band, ...filter } = queryOf(request, TrendQuery);
      response.json(trend(context, found, choice(context, found, filter), band));
    })
    .get('/v1/products/:product/margin-map', (request, response) => {
      const found = product(request);
      response.json(marginMap(context, found, choice(context, found, queryOf(request, SeriesFilter))));
    });
}

/**
 * The filter with the state's name looked up.
 *
 * @throws ServiceError `invalid` for an unknown state, and for another limit than the product's sweeps are held against
 */
function choice(context: Context, { product }: FoundProduct, filter: SeriesFilter): SeriesChoice {
  const { state, limit, ...rest } = filter;
  if (limit !== undefined && limit !== product.limitSetKey) {
    const rule = `the sweeps of "${product.key}" are held against ${product.limitSetKey}`;
    throw new ServiceError('invalid', `limit: "${limit}" is not the product's: ${rule}`);
  }
  return state === undefined ? rest : { ...rest, stateId: stateNamed(context, product, state).id };
}
