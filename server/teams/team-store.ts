import { asc, eq, inArray } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { teams } from '../db/schema';

export type Team = typeof teams.$inferSelect;

export function findTeamByKey(db: Database, key: string): Team | undefined {
  return db.select().from(teams).where(eq(teams.key, key)).get();
}

export function findTeamById(db: Database, id: number): Team | undefined {
  return db.select().from(teams).where(eq(teams.id, id)).get();
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
