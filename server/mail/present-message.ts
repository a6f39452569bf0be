import type { MailboxMessage, MailboxSummary } from '@shared/contracts/digests';
import { simpleParser } from 'mailparser';
import { isoTime } from '../iso-time';
import type { MailboxRow } from './mailbox-store';

export function presentMessageRow(row: Omit<MailboxRow, 'raw'>): MailboxSummary {
  const { id, receivedAt, fromAddress, toAddress, subject } = row;
  return { id, receivedAt: isoTime(receivedAt), from: fromAddress, to: toAddress, subject };
}

/** The message as a mail program would show it: pictures named by content id stand in the HTML as data addresses. */
export async function presentMessage(row: MailboxRow): Promise<MailboxMessage> {
  const parsed = await simpleParser(row.raw);
  return {
    ...presentMessageRow(row),
    text: parsed.text ?? '',
    html: parsed.html || null,
    headers: parsed.headerLines.map(({ line }) => {
      const colon = line.indexOf(':');
      return { name: line.slice(0, colon), value: line.slice(colon + 1).trim() };
    }),
    attachments: parsed.attachments.map(({ filename, contentType, content }) => ({
      fileName: filename ?? '',
      contentType,
      byteLength: content.length,
      dataUrl: `data:${contentType};base64,${content.toString('base64')}`,
    })),
  };
}
