import { createHash } from 'node:crypto';
import type { SendMailOptions, Transporter } from 'nodemailer';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import type { HeldRun } from '../queue/held-run';
import { isAboutThisMail, isRefusedForGood, SHORTEST_WAIT_MS, waitAfter } from './attempt-policy';
import { openTransport } from './open-transport';
import { findDueMail, listAttachments, listDueMailIds, type OutboxMail, updateMail } from './outbox-store';

/** Links in these are secrets of which the database otherwise keeps only hashes, so their text goes once it is not needed. */
const SECRET_KINDS: readonly OutboxMail['kind'][] = ['invitation', 'passwordReset'];

/**
 * Sends every mail that is due. An attempt is written down before it begins, with the time of the next, so that a second
 * worker passes the mail by. SMTP leaves one gap, a stop between the server's taking the mail and our writing it down
 * (RFC 1047): the mail then goes again under the same Message-ID, by which receiving servers know it.
 */
export async function sendDueMail(context: Context, held: HeldRun): Promise<void> {
  const due = listDueMailIds(context.db, context.now());
  held.expect(due.length);
  if (due.length === 0) return;
  const transport = openTransport(context);
  try {
    for (const id of due) {
      const mail = beginAttempt(context, id);
      if (mail === undefined) continue;
      const error = await attempt(context, transport, mail);
      if (error === undefined) held.advance('sent');
      else held.note(`mail ${mail.id} to ${mail.toEmail}`, error);
      if (error !== undefined && !isAboutThisMail(error)) break;
    }
  } finally {
    transport.close();
  }
}

function beginAttempt(context: Context, id: number): OutboxMail | undefined {
  return withTransaction(context.db, () => {
    const now = context.now();
    const mail = findDueMail(context.db, id, now);
    if (mail === undefined) return undefined;
    const attempts = mail.attempts + 1;
    updateMail(context.db, id, { attempts, nextAttemptAt: now + (waitAfter(attempts) ?? SHORTEST_WAIT_MS) });
    return { ...mail, attempts };
  });
}

/** Returns what went wrong, or undefined for a mail the server took. */
async function attempt(context: Context, transport: Transporter, mail: OutboxMail): Promise<Error | undefined> {
  const error = await deliver(transport, compose(context, mail));
  if (error === undefined) {
    settle(context, mail, { status: 'sent', sentAt: context.now(), lastError: null });
  } else if (isRefusedForGood(error) || waitAfter(mail.attempts) === undefined) {
    settle(context, mail, { status: 'failed', lastError: error.message });
  } else {
    updateMail(context.db, mail.id, { lastError: error.message });
  }
  return error;
}

async function deliver(transport: Transporter, message: SendMailOptions): Promise<Error | undefined> {
  try {
    await transport.sendMail(message);
    return undefined;
  } catch (thrown) {
    return thrown instanceof Error ? thrown : new Error(String(thrown));
  }
}

function settle(context: Context, mail: OutboxMail, change: Partial<OutboxMail>): void {
  const emptied = SECRET_KINDS.includes(mail.kind) ? { text: '', html: '' } : {};
  updateMail(context.db, mail.id, { ...change, ...emptied });
}

function compose(context: Context, mail: OutboxMail): SendMailOptions {
  const { onceKey, toEmail: to, subject, text, html, headers } = mail;
  const domain = new URL(context.config.publicUrl).hostname;
  return {
    from: context.config.mailFrom,
    to: { name: '', address: to },
    subject,
    text,
    html,
    headers,
    date: new Date(mail.createdAt),
    messageId: `<${createHash('sha256').update(onceKey).digest('hex').slice(0, 32)}@${domain}>`,
    attachments: listAttachments(context.db, mail.id).map(({ fileName, contentId, contentType, content }) => ({
      filename: fileName,
      cid: contentId,
      contentType,
      content,
      contentDisposition: 'inline',
    })),
  };
}
