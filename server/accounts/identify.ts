import type { RequestHandler } from 'express';
import type { Context } from '../context';
import { setActor } from '../http/actor-of';
import type {} from '../http/session-user';
import { authenticateToken } from '../tokens/authenticate-token';
import { personActor } from './person-actor';

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
