import { and, desc, eq, isNull, lt } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { auditEntries } from '../db/schema';

export type AuditEntry = typeof auditEntries.$inferSelect;

export function insertAuditEntry(db: Database, entry: typeof auditEntries.$inferInsert): void {
  db.insert(auditEntries).values(entry).run();
}

/** Entries of a team (null: of the installation), newest first. */
export function listAuditEntries(
  db: Database,
  teamId: number | null,
  before: number | null,
  limit: number,
): AuditEntry[] {
  return db
    .select()
    .from(auditEntries)
    .where(
      and(
        teamId === null ? isNull(auditEntries.teamId) : eq(auditEntries.teamId, teamId),
        before === null ? undefined : lt(auditEntries.id, before),
      ),
    )
    .orderBy(desc(auditEntries.id))
    .limit(limit)
    .all();
}
