import { sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { bytes, moment, rowId } from './columns';

/** What the local SMTP fake of development and demo received; never filled in production, so no team. */
export const mailboxMessages = sqliteTable('mailbox_messages', {
  id: rowId(),
  receivedAt: moment('received_at').notNull(),
  fromAddress: text('from_address').notNull(),
  toAddress: text('to_address').notNull(),
  subject: text('subject').notNull(),
  /** The message as it came over SMTP. */
  raw: bytes('raw').notNull(),
});
