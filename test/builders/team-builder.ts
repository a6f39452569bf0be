import type { Role } from '@shared/access/roles';
import { TOKEN_SCOPES, type TokenScope } from '@shared/access/token-scopes';
import type { PersonActor } from '../../server/actor';
import { personActor } from '../../server/accounts/person-actor';
import { insertPerson, type Person } from '../../server/accounts/person-store';
import type { Context } from '../../server/context';
import { benches, memberships, products, teams } from '../../server/db/schema';
import { insertToken } from '../../server/tokens/token-store';
import { formatToken, hashSecret, newSecret } from '../../server/tokens/token-secret';

/** Password of every built person; hashed lazily by tests that sign in through the real route. */
export const TEST_PASSWORD = 'correct horse battery';
let serial = 0;

export function buildTeam(
  context: Context,
  override: Partial<typeof teams.$inferInsert> = {},
): typeof teams.$inferSelect {
  serial += 1;
  const values = {
    key: `team-${serial}`,
    name: `Team ${serial}`,
    timeZone: 'Europe/Lisbon',
    createdAt: context.now(),
    ...override,
  };
  return context.db.insert(teams).values(values).returning().get();
}

/** A person with a role in a team, or in none. `passwordHash` must be given where the test signs in. */
export function buildPerson(
  context: Context,
  override: Partial<Person> & { teamId?: number; role?: Role } = {},
): { person: Person; actor: PersonActor } {
  serial += 1;
  const { teamId, role = 'viewer', ...columns } = override;
  const person = insertPerson(context.db, {
    email: `person-${serial}@strandline.example`,
    name: `Person ${serial}`,
    passwordHash: 'none',
    createdAt: context.now(),
    ...columns,
  });
  if (teamId !== undefined) {
    context.db.insert(memberships).values({ teamId, personId: person.id, role, createdAt: context.now() }).run();
  }
  const actor = personActor(context, person.id);
  if (actor === undefined) throw new Error('the built person is disabled');
  return { person, actor };
}

/** A team token and what its holder writes into the header. */
export function buildToken(
  context: Context,
  teamId: number,
  createdBy: number,
  scopes: readonly TokenScope[] = TOKEN_SCOPES,
): string {
  const secret = newSecret();
  const token = insertToken(context.db, {
    teamId,
    name: 'bench script',
    secretHash: hashSecret(secret),
    scopes: [...scopes],
    createdBy,
    createdAt: context.now(),
  });
  return formatToken(token.id, secret);
}

export function buildProduct(
  context: Context,
  teamId: number,
  override: Partial<typeof products.$inferInsert> = {},
): typeof products.$inferSelect {
  serial += 1;
  const values = {
    teamId,
    key: `product-${serial}`,
    name: `Product ${serial}`,
    limitSetKey: 'CISPR32_B',
    createdAt: context.now(),
    ...override,
  };
  return context.db.insert(products).values(values).returning().get();
}

export function buildBench(
  context: Context,
  teamId: number,
  override: Partial<typeof benches.$inferInsert> = {},
): typeof benches.$inferSelect {
  serial += 1;
  const values = { teamId, key: `bench-${serial}`, name: `Bench ${serial}`, createdAt: context.now(), ...override };
  return context.db.insert(benches).values(values).returning().get();
}
