import { desc, eq } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { mailboxMessages } from '../db/schema';

export type MailboxRow = typeof mailboxMessages.$inferSelect;
type MailboxHeading = Omit<MailboxRow, 'raw'>;

export function insertMessage(db: Database, message: typeof mailboxMessages.$inferInsert): void {
  db.insert(mailboxMessages).values(message).run();
}

/** Newest first, without their text. */
export function listMessages(db: Database, limit: number): MailboxHeading[] {
  const { id, receivedAt, fromAddress, toAddress, subject } = mailboxMessages;
  return db
    .select({ id, receivedAt, fromAddress, toAddress, subject })
    .from(mailboxMessages)
    .orderBy(desc(id))
    .limit(limit)
    .all();
}

export function findMessage(db: Database, id: number): MailboxRow | undefined {
  return db.select().from(mailboxMessages).where(eq(mailboxMessages.id, id)).get();
}
