import { type Action, PERMISSIONS, type Permission } from './permissions';
import { isAtLeast, type Role } from './roles';
import type { TokenScope } from './token-scopes';

/** Who asks, as far as permission goes. */
export type Subject =
  | { readonly kind: 'person'; readonly roles: ReadonlyMap<number, Role> }
  | { readonly kind: 'token'; readonly teamId: number; readonly scopes: readonly TokenScope[] }
  | { readonly kind: 'job' };

/**
 * Whether the subject may do the action in the team. Unknown roles, teams and scopes: no.
 * Jobs act for the installation and may do everything their code does.
 */
export function may(subject: Subject, action: Action, teamId: number): boolean {
  const permission: Permission = PERMISSIONS[action];
  switch (subject.kind) {
    case 'job':
      return true;
    case 'token':
      return subject.teamId === teamId && permission.scope !== undefined && subject.scopes.includes(permission.scope);
    case 'person': {
      const role = subject.roles.get(teamId);
      return role !== undefined && isAtLeast(role, permission.role);
    }
  }
}

/** Whether the subject belongs to the team at all, so that it may learn that something exists there. */
export function belongsTo(subject: Subject, teamId: number): boolean {
  switch (subject.kind) {
    case 'job':
      return true;
    case 'token':
      return subject.teamId === teamId;
    case 'person':
      return subject.roles.has(teamId);
  }
}
