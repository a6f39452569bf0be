import type { Role } from '@shared/access/roles';
import type { PersonView } from '@shared/contracts/teams';

/** What an administrator may change of a person. */
export type PersonChange = { person: PersonView } & (
  | { kind: 'role'; team: string; role: Role }
  | { kind: 'leave'; team: string; teamName: string }
  | { kind: 'account'; patch: { isAdministrator?: boolean; isDisabled?: boolean } }
);
