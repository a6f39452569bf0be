import { asc, count, eq, inArray, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { prepared } from '../db/prepared';
import { memberships, products, teams } from '../db/schema';

export type Team = typeof teams.$inferSelect;

export function findTeamByKey(db: Database, key: string): Team | undefined {
  return db.select().from(teams).where(eq(teams.key, key)).get();
}

const byId = prepared((db) =>
  db
    .select()
    .from(teams)
    .where(eq(teams.id, sql.placeholder('id')))
    .prepare(),
);

export function findTeamById(db: Database, id: number): Team | undefined {
  return byId(db).get({ id });
}

/** By name. */
export function listTeamsById(db: Database, ids: readonly number[]): Team[] {
  return db
    .select()
    .from(teams)
    .where(inArray(teams.id, [...ids]))
    .orderBy(asc(teams.name))
    .all();
}

/** Every team by name. */
export function listTeamRows(db: Database): Team[] {
  return db.select().from(teams).orderBy(asc(teams.name)).all();
}

/** Undefined when the key is taken. */
export function insertTeam(db: Database, team: typeof teams.$inferInsert): Team | undefined {
  return db.insert(teams).values(team).onConflictDoNothing().returning().get();
}

export function updateTeam(db: Database, id: number, change: Partial<typeof teams.$inferInsert>): Team {
  return db.update(teams).set(change).where(eq(teams.id, id)).returning().get();
}

export function listProductIds(db: Database, teamId: number): number[] {
  const rows = db.select({ id: products.id }).from(products).where(eq(products.teamId, teamId)).all();
  return rows.map(({ id }) => id);
}

export function countMembers(db: Database, teamId: number): number {
  const isIn = eq(memberships.teamId, teamId);
  return db.select({ members: count() }).from(memberships).where(isIn).get()?.members ?? 0;
}

export function countProducts(db: Database, teamId: number): number {
  const isIn = eq(products.teamId, teamId);
  return db.select({ products: count() }).from(products).where(isIn).get()?.products ?? 0;
}
