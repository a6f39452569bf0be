import { desc, eq, isNull, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { prepared } from '../db/prepared';
import { people, teamTokens } from '../db/schema';

export type TeamToken = typeof teamTokens.$inferSelect;

const byId = prepared((db) =>
  db
    .select()
    .from(teamTokens)
    .where(eq(teamTokens.id, sql.placeholder('id')))
    .prepare(),
);

export function findToken(db: Database, id: number): TeamToken | undefined {
  return byId(db).get({ id });
}

export function insertToken(db: Database, token: typeof teamTokens.$inferInsert): TeamToken {
  return db.insert(teamTokens).values(token).returning().get();
}

export function markTokenUsed(db: Database, id: number, at: number): void {
  db.update(teamTokens).set({ lastUsedAt: at }).where(eq(teamTokens.id, id)).run();
}

export function markTokenRevoked(db: Database, id: number, at: number): void {
  db.update(teamTokens).set({ revokedAt: at }).where(eq(teamTokens.id, id)).run();
}

/** Tokens of a team with who made them: those in force first, then newest first. */
export function listTokenRows(db: Database, teamId: number): { token: TeamToken; createdByName: string }[] {
  return db
    .select({ token: teamTokens, createdByName: people.name })
    .from(teamTokens)
    .innerJoin(people, eq(people.id, teamTokens.createdBy))
    .where(eq(teamTokens.teamId, teamId))
    .orderBy(desc(isNull(teamTokens.revokedAt)), desc(teamTokens.id))
    .all();
}
