import { eq } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { teams } from '../db/schema';

export type Team = typeof teams.$inferSelect;

export function findTeamByKey(db: Database, key: string): Team | undefined {
  return db.select().from(teams).where(eq(teams.key, key)).get();
}

export function findTeamById(db: Database, id: number): Team | undefined {
  return db.select().from(teams).where(eq(teams.id, id)).get();
}
