import { and, eq, gt, isNull } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { passwordResets } from '../db/schema';

export type PasswordReset = typeof passwordResets.$inferSelect;

export function insertReset(db: Database, reset: typeof passwordResets.$inferInsert): PasswordReset {
  return db.insert(passwordResets).values(reset).returning().get();
}

/** The reset with this hash if it was neither used nor has run out. */
export function findOpenReset(db: Database, tokenHash: string, now: number): PasswordReset | undefined {
  const { usedAt, expiresAt } = passwordResets;
  return db
    .select()
    .from(passwordResets)
    .where(and(eq(passwordResets.tokenHash, tokenHash), isNull(usedAt), gt(expiresAt, now)))
    .get();
}

/** Uses up every open reset of the person. */
export function closeResetsOf(db: Database, personId: number, now: number): void {
  db.update(passwordResets)
    .set({ usedAt: now })
    .where(and(eq(passwordResets.personId, personId), isNull(passwordResets.usedAt)))
    .run();
}
