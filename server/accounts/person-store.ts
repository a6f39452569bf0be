import type { Role } from '@shared/access/roles';
import { and, asc, count, eq, isNull } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { memberships, people, teams } from '../db/schema';

export type Person = typeof people.$inferSelect;

export function findPersonById(db: Database, id: number): Person | undefined {
  return db.select().from(people).where(eq(people.id, id)).get();
}

/** @param email in lower case */
export function findPersonByEmail(db: Database, email: string): Person | undefined {
  return db.select().from(people).where(eq(people.email, email)).get();
}

export function insertPerson(db: Database, person: typeof people.$inferInsert): Person {
  return db.insert(people).values(person).returning().get();
}

/** Roles of a person by team id, archived teams left out. */
export function rolesOf(db: Database, personId: number): Map<number, Role> {
  const rows = db
    .select({ teamId: memberships.teamId, role: memberships.role })
    .from(memberships)
    .innerJoin(teams, eq(teams.id, memberships.teamId))
    .where(and(eq(memberships.personId, personId), eq(teams.isArchived, false)))
    .all();
  return new Map(rows.map((row) => [row.teamId, row.role]));
}

export function listPersonRows(db: Database): Person[] {
  return db.select().from(people).orderBy(asc(people.name), asc(people.id)).all();
}

/** Who is in which team with which role, archived teams left out, teams by name. */
export function listMembershipsOfAll(db: Database) {
  return db
    .select({ personId: memberships.personId, team: teams.key, teamName: teams.name, role: memberships.role })
    .from(memberships)
    .innerJoin(teams, eq(teams.id, memberships.teamId))
    .where(eq(teams.isArchived, false))
    .orderBy(asc(teams.name))
    .all();
}

export function updatePerson(db: Database, id: number, change: Partial<typeof people.$inferInsert>): void {
  db.update(people).set(change).where(eq(people.id, id)).run();
}

/** How many administrators can sign in. */
export function countAdministrators(db: Database): number {
  const isAble = and(eq(people.isAdministrator, true), isNull(people.disabledAt));
  return db.select({ administrators: count() }).from(people).where(isAble).get()?.administrators ?? 0;
}
