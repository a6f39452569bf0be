import { isAtLeast } from '@shared/access/roles';
import type { SessionView } from '@shared/contracts/session';
import type { PersonView } from '@shared/contracts/teams';
import { listPeople } from '../accounts/list-people';
import type { Context } from '../context';

/** Password of everybody in the demo. Public, which is why production refuses the demo. */
export const DEMO_PASSWORD = 'strandline-demo';
/** E-mail domain of the demo's company; `.example` is reserved and belongs to nobody (RFC 2606). */
export const DEMO_DOMAIN = 'brackenholt.example';

/** The people one may look around the demo as, most powerful first; none unless this installation holds the demo. */
export function demoSignIns(context: Context): SessionView['demoSignIns'] {
  if (!context.config.seedsDemo) return [];
  return listPeople(context)
    .filter((person) => person.email.endsWith(`@${DEMO_DOMAIN}`) && !person.isDisabled)
    .sort((a, b) => rank(b) - rank(a))
    .map((person) => ({ email: person.email, name: person.name, role: describe(person), password: DEMO_PASSWORD }));
}

function rank(person: PersonView): number {
  const leads = ['technician', 'engineer', 'lead'] as const;
  const highest = leads.filter((least) => person.memberships.some(({ role }) => isAtLeast(role, least))).length;
  return person.isAdministrator ? leads.length + 1 : highest;
}

function describe({ isAdministrator, memberships }: PersonView): string {
  const roles = memberships.map(({ role, teamName }) => `${role}, ${teamName}`);
  return [...(isAdministrator ? ['administrator'] : []), ...roles].join('; ');
}
