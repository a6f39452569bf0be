import type { Request } from 'express';
import type { Actor, PersonActor } from '../actor';
import { requirePerson } from '../require-permission';
import { ServiceError } from '../service-error';

const actors = new WeakMap<Request, Actor>();

/** Notes who makes the request; `identify.ts` is the one caller. */
export function setActor(request: Request, actor: Actor): void {
  actors.set(request, actor);
}

/** Who makes the request, or undefined for somebody not signed in. */
export function actorIfAny(request: Request): Actor | undefined {
  return actors.get(request);
}

/** @throws ServiceError `signedOut` when nobody is signed in and no token was sent */
export function actorOf(request: Request): Actor {
  const actor = actors.get(request);
  if (actor === undefined) throw new ServiceError('signedOut', 'sign in first, or send a team token');
  return actor;
}

/** @throws ServiceError `signedOut`, or `forbidden` for a token */
export function personOf(request: Request): PersonActor {
  return requirePerson(actorOf(request));
}
