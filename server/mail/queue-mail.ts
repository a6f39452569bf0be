import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { findMailByOnceKey, insertAttachment, insertMail, type NewAttachment, type OutboxMail } from './outbox-store';
import { enqueueMailRun } from './request-mail';

export interface MailToQueue extends Pick<OutboxMail, 'kind' | 'onceKey' | 'toEmail' | 'subject' | 'text' | 'html'> {
  /** Null for mail of the installation. */
  teamId: number | null;
  headers?: Record<string, string>;
  attachments?: readonly NewAttachment[];
}

/**
 * Writes a mail into the outbox and asks the jobs process to send it. A mail with the same once-key is written once ever;
 * asked for again, the standing one is returned. Call it in the transaction of what it tells of.
 */
export function queueMail(context: Context, mail: MailToQueue): OutboxMail {
  const { attachments = [], ...columns } = mail;
  const { db } = context;
  return withTransaction(db, () => {
    const now = context.now();
    const written = insertMail(db, { ...columns, createdAt: now, nextAttemptAt: now });
    if (written === undefined) return standingMail(context, mail.onceKey);
    for (const attachment of attachments) insertAttachment(db, written.id, attachment);
    enqueueMailRun(context, 'schedule');
    return written;
  });
}

function standingMail(context: Context, onceKey: string): OutboxMail {
  const standing = findMailByOnceKey(context.db, onceKey);
  if (standing === undefined) throw new Error(`the mail ${onceKey} was neither stored nor found`);
  return standing;
}
