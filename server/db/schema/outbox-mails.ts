import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';

export const MAIL_KINDS = ['invitation', 'passwordReset', 'digest', 'drop'] as const;
export const MAIL_STATUSES = ['waiting', 'sent', 'failed'] as const;

/** Mail to be sent or sent. A null team: mail of the installation, such as a password reset. */
export const outboxMails = sqliteTable(
  'outbox_mails',
  {
    id: rowId(),
    teamId: integer('team_id'),
    kind: text('kind', { enum: MAIL_KINDS }).notNull(),
    /** A mail with this key is written once ever. */
    onceKey: text('once_key').notNull(),
    toEmail: text('to_email').notNull(),
    subject: text('subject').notNull(),
    text: text('text').notNull(),
    html: text('html').notNull(),
    headers: text('headers', { mode: 'json' }).$type<Record<string, string>>().notNull().default({}),
    status: text('status', { enum: MAIL_STATUSES }).notNull().default('waiting'),
    createdAt: moment('created_at').notNull(),
    attempts: integer('attempts').notNull().default(0),
    nextAttemptAt: moment('next_attempt_at').notNull(),
    sentAt: moment('sent_at'),
    lastError: text('last_error'),
  },
  (table) => [
    uniqueIndex('outbox_mails_once').on(table.onceKey),
    index('outbox_mails_due').on(table.status, table.nextAttemptAt),
  ],
);
