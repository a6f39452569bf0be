import { LIMIT_SETS } from '@shared/limits/limit-sets';
import { Router } from 'express';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { presentLimitSet } from './present-limit-set';

/** Limit sets. */
export function limitRoutes(_context: Context): Router {
  return Router().get('/v1/limits', (request, response) => {
    actorOf(request);
    response.json(LIMIT_SETS.map(presentLimitSet));
  });
}
