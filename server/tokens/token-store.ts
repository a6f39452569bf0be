import { eq } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { teamTokens } from '../db/schema';

export type TeamToken = typeof teamTokens.$inferSelect;

export function findToken(db: Database, id: number): TeamToken | undefined {
  return db.select().from(teamTokens).where(eq(teamTokens.id, id)).get();
}

export function insertToken(db: Database, token: typeof teamTokens.$inferInsert): TeamToken {
  return db.insert(teamTokens).values(token).returning().get();
}

export function markTokenUsed(db: Database, id: number, at: number): void {
  db.update(teamTokens).set({ lastUsedAt: at }).where(eq(teamTokens.id, id)).run();
}
