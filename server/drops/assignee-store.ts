import type { Role } from '@shared/access/roles';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { memberships, people } from '../db/schema';

export interface Member {
  id: number;
  name: string;
  role: Role;
}

/** People of a team who can sign in, by name. */
export function listMembers(db: Database, teamId: number): Member[] {
  return db
    .select({ id: people.id, name: people.name, role: memberships.role })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(and(eq(memberships.teamId, teamId), isNull(people.disabledAt)))
    .orderBy(asc(people.name), asc(people.id))
    .all();
}
