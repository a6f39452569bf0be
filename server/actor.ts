import type { Role } from '@shared/access/roles';
import type { TokenScope } from '@shared/access/token-scopes';

export interface PersonActor {
  readonly kind: 'person';
  readonly personId: number;
  readonly name: string;
  readonly email: string;
  readonly isAdministrator: boolean;
  /** Role by team id. */
  readonly roles: ReadonlyMap<number, Role>;
}

export interface TokenActor {
  readonly kind: 'token';
  readonly tokenId: number;
  readonly name: string;
  readonly teamId: number;
  readonly scopes: readonly TokenScope[];
}

export interface JobActor {
  readonly kind: 'job';
  readonly name: string;
}

/** Who does something; stored with every change. */
export type Actor = PersonActor | TokenActor | JobActor;

/** The actor's own row id, or null for a job. */
export function actorId(actor: Actor): number | null {
  switch (actor.kind) {
    case 'person':
      return actor.personId;
    case 'token':
      return actor.tokenId;
    case 'job':
      return null;
  }
}

/** The actor as the columns `actor_kind`, `actor_id`, `actor_name`. */
export function actorColumns(actor: Actor): { actorKind: Actor['kind']; actorId: number | null; actorName: string } {
  return { actorKind: actor.kind, actorId: actorId(actor), actorName: actor.name };
}
