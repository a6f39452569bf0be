import type { RequestHandler } from 'express';
import { personActor } from '../accounts/person-actor';
import type { Context } from '../context';
import { authenticateToken } from '../tokens/authenticate-token';
import { setActor } from './actor-of';
import type {} from './session-user';

/** Finds out who makes the request: a team token in the header, or the person of the session. */
export function identify(context: Context): RequestHandler {
  return (request, _response, next) => {
    const bearer = /^Bearer (.+)$/i.exec(request.get('authorization') ?? '')?.[1];
    if (bearer !== undefined) {
      setActor(request, authenticateToken(context, bearer));
    } else {
      const personId = request.user?.personId;
      const actor = personId === undefined ? undefined : personActor(context, personId);
      if (actor !== undefined) setActor(request, actor);
    }
    next();
  };
}
