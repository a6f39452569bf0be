import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { bytes, rowId } from './columns';
import { outboxMails } from './outbox-mails';

/** Pictures of a mail (team through the mail). */
export const outboxAttachments = sqliteTable(
  'outbox_attachments',
  {
    id: rowId(),
    mailId: integer('mail_id')
      .notNull()
      .references(() => outboxMails.id),
    fileName: text('file_name').notNull(),
    contentId: text('content_id').notNull(),
    contentType: text('content_type').notNull(),
    content: bytes('content').notNull(),
  },
  (table) => [index('outbox_attachments_mail').on(table.mailId)],
);
