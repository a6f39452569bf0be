import { belongsTo, may } from '@shared/access/may';
import { type Action, leastRole } from '@shared/access/permissions';
import type { Actor, PersonActor } from './actor';
import { ServiceError } from './service-error';

/**
 * Stops an actor who may not do the action in the team.
 *
 * @throws ServiceError `notFound` for an actor outside the team, who must not learn that it exists; `forbidden` inside it
 */
export function requirePermission(actor: Actor, action: Action, teamId: number): void {
  if (may(actor, action, teamId)) return;
  if (!belongsTo(actor, teamId))
    throw new ServiceError('notFound', 'there is no such thing, or it belongs to another team');
  throw new ServiceError(
    'forbidden',
    actor.kind === 'token'
      ? `the token "${actor.name}" has no scope for this (${action})`
      : `this needs the role ${leastRole(action)} in the team (${action})`,
  );
}

/** @throws ServiceError `forbidden` unless the actor is an administrator of the installation */
export function requireAdministrator(actor: Actor): PersonActor {
  if (actor.kind === 'person' && actor.isAdministrator) return actor;
  throw new ServiceError('forbidden', 'this needs an administrator of the installation');
}

/** @throws ServiceError `forbidden` unless the actor is a person: tokens and jobs have no account */
export function requirePerson(actor: Actor): PersonActor {
  if (actor.kind === 'person') return actor;
  throw new ServiceError('forbidden', 'this needs a signed-in person; a team token is not enough');
}
