/** Roles of a person in one team, least first; each includes the ones before it. */
export const ROLES = ['viewer', 'technician', 'engineer', 'lead'] as const;

export type Role = (typeof ROLES)[number];

/** Whether `role` is `least` or more. */
export function isAtLeast(role: Role, least: Role): boolean {
  return ROLES.indexOf(role) >= ROLES.indexOf(least);
}
