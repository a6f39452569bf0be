import { type RequestHandler, Router } from 'express';
import { personActor } from '../accounts/person-actor';
import type { Context } from '../context';
import { authenticateToken } from '../tokens/authenticate-token';
import { setActor } from './actor-of';
import { readSession } from './session-of-request';
import type {} from './session-user';

/**
 * Finds out who makes the request: a team token in the header, or the person of the session. A request with a token has
 * no session: the cookie beside it counts for nothing, and a bench that sends many sweeps does not pay for one each.
 */
export function identify(context: Context): Router {
  const byToken: RequestHandler = (request, _response, next) => {
    const bearer = /^Bearer (.+)$/i.exec(request.get('authorization') ?? '')?.[1];
    if (bearer === undefined) {
      next();
      return;
    }
    setActor(request, authenticateToken(context, bearer));
    next('router');
  };
  const bySession: RequestHandler = (request, _response, next) => {
    const personId = request.user?.personId;
    const actor = personId === undefined ? undefined : personActor(context, personId);
    if (actor !== undefined) setActor(request, actor);
    next();
  };
  return Router().use(byToken, ...readSession(context), bySession);
}
