import type { Role } from './roles';
import type { TokenScope } from './token-scopes';

export interface Permission {
  /** Least role of a person in the team. */
  readonly role: Role;
  /** Scope that lets a team token do it; absent: no token may. */
  readonly scope?: TokenScope;
}

/**
 * Who may do what in a team: the one table that the server enforces and the pages show by.
 * Administrators of the installation manage teams and people; in a team they have what their membership gives.
 */
export const PERMISSIONS = {
  'results.read': { role: 'viewer', scope: 'results:read' },
  'gate.read': { role: 'viewer', scope: 'gate:read' },
  'sweeps.add': { role: 'technician', scope: 'sweeps:write' },
  'builds.evaluate': { role: 'technician', scope: 'sweeps:write' },
  'sweeps.remove': { role: 'engineer' },
  'builds.edit': { role: 'technician' },
  'benches.edit': { role: 'engineer' },
  'drops.triage': { role: 'engineer' },
  'products.edit': { role: 'lead' },
  'products.share': { role: 'lead' },
  'references.choose': { role: 'lead' },
  'judging.start': { role: 'lead' },
  'team.edit': { role: 'lead' },
  'members.manage': { role: 'lead' },
  'tokens.manage': { role: 'lead' },
  'digests.manage': { role: 'lead' },
  'audit.read': { role: 'lead' },
  'jobs.read': { role: 'viewer' },
} as const satisfies Record<string, Permission>;

export type Action = keyof typeof PERMISSIONS;

/** Least role that may do `action`. */
export function leastRole(action: Action): Role {
  return PERMISSIONS[action].role;
}
