import { and, asc, desc, eq, inArray, isNull, like, or, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { digestRecipients, digests, digestSettings, memberships, outboxMails, people, teams } from '../db/schema';

export type DigestRecipient = typeof digestRecipients.$inferSelect;
export type Digest = typeof digests.$inferSelect;

const DEFAULT_SETTING = { isOn: true, weekday: 1, hour: 7 };
export type DigestSetting = typeof DEFAULT_SETTING;

export function readSetting(db: Database, teamId: number): DigestSetting {
  const row = db.select().from(digestSettings).where(eq(digestSettings.teamId, teamId)).get();
  return row ?? DEFAULT_SETTING;
}

export function writeSetting(db: Database, teamId: number, setting: DigestSetting): void {
  const { isOn, weekday, hour } = setting;
  db.insert(digestSettings)
    .values({ teamId, isOn, weekday, hour })
    .onConflictDoUpdate({ target: digestSettings.teamId, set: { isOn, weekday, hour } })
    .run();
}

/** Teams that are not archived, with when they want their digest. */
export function listDigestTeams(db: Database): (typeof teams.$inferSelect)[] {
  return db.select().from(teams).where(eq(teams.isArchived, false)).all();
}

export function listRecipients(db: Database, teamId: number): DigestRecipient[] {
  return db
    .select()
    .from(digestRecipients)
    .where(eq(digestRecipients.teamId, teamId))
    .orderBy(asc(digestRecipients.email))
    .all();
}

/** Those who may get the digest, unsubscribed or not: addresses outside, and people who are still members and may sign in. */
export function listReaders(db: Database, teamId: number): DigestRecipient[] {
  const members = db
    .select({ id: memberships.personId })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(and(eq(memberships.teamId, teamId), isNull(people.disabledAt)));
  return db
    .select()
    .from(digestRecipients)
    .where(
      and(
        eq(digestRecipients.teamId, teamId),
        or(isNull(digestRecipients.personId), inArray(digestRecipients.personId, members)),
      ),
    )
    .orderBy(asc(digestRecipients.email))
    .all();
}

export function findRecipientBySecret(db: Database, secret: string): DigestRecipient | undefined {
  return db.select().from(digestRecipients).where(eq(digestRecipients.unsubscribeSecret, secret)).get();
}

/** Adds a recipient, or subscribes the one with this address again. */
export function upsertRecipient(db: Database, recipient: typeof digestRecipients.$inferInsert): DigestRecipient {
  const { name, personId } = recipient;
  return db
    .insert(digestRecipients)
    .values(recipient)
    .onConflictDoUpdate({
      target: [digestRecipients.teamId, digestRecipients.email],
      set: { unsubscribedAt: null, name, personId: sql`coalesce(${personId ?? null}, ${digestRecipients.personId})` },
    })
    .returning()
    .get();
}

export function markUnsubscribed(db: Database, id: number, at: number): void {
  db.update(digestRecipients).set({ unsubscribedAt: at }).where(eq(digestRecipients.id, id)).run();
}

/** Removes a recipient of the team; false when it has none with this number. */
export function deleteRecipient(db: Database, teamId: number, id: number): boolean {
  const own = and(eq(digestRecipients.teamId, teamId), eq(digestRecipients.id, id));
  return db.delete(digestRecipients).where(own).run().changes === 1;
}

/** Keeps what the team is told of a period; the first writing stands. */
export function insertDigest(db: Database, digest: typeof digests.$inferInsert): Digest | undefined {
  return db.insert(digests).values(digest).onConflictDoNothing().returning().get();
}

export function findDigest(db: Database, teamId: number, period: string): Digest | undefined {
  return db
    .select()
    .from(digests)
    .where(and(eq(digests.teamId, teamId), eq(digests.period, period)))
    .get();
}

/** The last digests of a team, newest first, those asked for by hand too. */
export function listDigests(db: Database, teamId: number, limit: number): Digest[] {
  return db.select().from(digests).where(eq(digests.teamId, teamId)).orderBy(desc(digests.id)).limit(limit).all();
}

/** How many mails of a digest are in which state. */
export function countDeliveries(
  db: Database,
  teamId: number,
  period: string,
): Record<'sent' | 'waiting' | 'failed', number> {
  const rows = db
    .select({ status: outboxMails.status, mails: sql<number>`count(*)` })
    .from(outboxMails)
    .where(and(eq(outboxMails.teamId, teamId), like(outboxMails.onceKey, `digest:${teamId}:${period}:%`)))
    .groupBy(outboxMails.status)
    .all();
  const counts = { sent: 0, waiting: 0, failed: 0 };
  for (const { status, mails } of rows) counts[status] = mails;
  return counts;
}
