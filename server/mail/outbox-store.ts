import { and, asc, eq, inArray, lt, lte, ne } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { outboxAttachments, outboxMails } from '../db/schema';

export type OutboxMail = typeof outboxMails.$inferSelect;
export type NewOutboxMail = typeof outboxMails.$inferInsert;
export type OutboxAttachment = typeof outboxAttachments.$inferSelect;
export type NewAttachment = Omit<typeof outboxAttachments.$inferInsert, 'id' | 'mailId'>;

/** Undefined when a mail with the once-key was written before. */
export function insertMail(db: Database, mail: NewOutboxMail): OutboxMail | undefined {
  return db.insert(outboxMails).values(mail).onConflictDoNothing().returning().get();
}

export function findMailByOnceKey(db: Database, onceKey: string): OutboxMail | undefined {
  return db.select().from(outboxMails).where(eq(outboxMails.onceKey, onceKey)).get();
}

export function insertAttachment(db: Database, mailId: number, attachment: NewAttachment): void {
  db.insert(outboxAttachments)
    .values({ ...attachment, mailId })
    .run();
}

export function listAttachments(db: Database, mailId: number): OutboxAttachment[] {
  return db
    .select()
    .from(outboxAttachments)
    .where(eq(outboxAttachments.mailId, mailId))
    .orderBy(asc(outboxAttachments.id))
    .all();
}

/** Ids of the mails whose time has come, oldest first. */
export function listDueMailIds(db: Database, now: number): number[] {
  return db
    .select({ id: outboxMails.id })
    .from(outboxMails)
    .where(and(eq(outboxMails.status, 'waiting'), lte(outboxMails.nextAttemptAt, now)))
    .orderBy(asc(outboxMails.nextAttemptAt), asc(outboxMails.id))
    .all()
    .map(({ id }) => id);
}

/** The mail if it is still due, which another worker may have changed. */
export function findDueMail(db: Database, id: number, now: number): OutboxMail | undefined {
  return db
    .select()
    .from(outboxMails)
    .where(and(eq(outboxMails.id, id), eq(outboxMails.status, 'waiting'), lte(outboxMails.nextAttemptAt, now)))
    .get();
}

/** Removes words and pictures of mails that were written before the moment and are not waiting. Returns how many. */
export function emptyEndedMails(db: Database, before: number): number {
  const ended = and(ne(outboxMails.status, 'waiting'), lt(outboxMails.createdAt, before));
  const ids = db.select({ id: outboxMails.id }).from(outboxMails).where(ended);
  db.delete(outboxAttachments).where(inArray(outboxAttachments.mailId, ids)).run();
  return db
    .update(outboxMails)
    .set({ text: '', html: '' })
    .where(and(ended, ne(outboxMails.html, '')))
    .run().changes;
}

export function updateMail(db: Database, id: number, change: Partial<NewOutboxMail>): void {
  db.update(outboxMails).set(change).where(eq(outboxMails.id, id)).run();
}
