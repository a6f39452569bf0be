import type { Role } from '@shared/access/roles';
import { and, asc, count, eq, isNull } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { memberships, people } from '../db/schema';

export interface Member {
  personId: number;
  name: string;
  email: string;
  role: Role;
  createdAt: number;
}

function members(db: Database) {
  const { personId, role, createdAt } = memberships;
  return db
    .select({ personId, name: people.name, email: people.email, role, createdAt })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId));
}

/** Members of a team by name; those whose account is disabled are left out. */
export function listMembers(db: Database, teamId: number): Member[] {
  return members(db)
    .where(and(eq(memberships.teamId, teamId), isNull(people.disabledAt)))
    .orderBy(asc(people.name), asc(people.id))
    .all();
}

export function findMember(db: Database, teamId: number, personId: number): Member | undefined {
  return members(db)
    .where(and(eq(memberships.teamId, teamId), eq(memberships.personId, personId)))
    .get();
}

export function upsertMembership(db: Database, membership: typeof memberships.$inferInsert): void {
  db.insert(memberships)
    .values(membership)
    .onConflictDoUpdate({ target: [memberships.teamId, memberships.personId], set: { role: membership.role } })
    .run();
}

export function deleteMembership(db: Database, teamId: number, personId: number): void {
  db.delete(memberships)
    .where(and(eq(memberships.teamId, teamId), eq(memberships.personId, personId)))
    .run();
}

/** How many leads of the team can sign in. */
export function countLeads(db: Database, teamId: number): number {
  const isAble = and(eq(memberships.teamId, teamId), eq(memberships.role, 'lead'), isNull(people.disabledAt));
  return (
    db
      .select({ leads: count() })
      .from(memberships)
      .innerJoin(people, eq(people.id, memberships.personId))
      .where(isAble)
      .get()?.leads ?? 0
  );
}
