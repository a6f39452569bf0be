import * as z from 'zod';
import { Email } from './primitives';

/** GET /api/teams/:team/digest */
export const DigestView = z.object({
  isOn: z.boolean(),
  weekday: z.int(),
  hour: z.int(),
  timeZone: z.string(),
  nextAt: z.string().nullable(),
  recipients: z.array(
    z.object({
      id: z.int(),
      name: z.string(),
      email: z.string(),
      isMember: z.boolean(),
      unsubscribedAt: z.string().nullable(),
    }),
  ),
  sent: z.array(
    z.object({
      id: z.int(),
      period: z.string(),
      subject: z.string(),
      createdAt: z.string(),
      delivered: z.int(),
      waiting: z.int(),
      failed: z.int(),
    }),
  ),
  /** Whether the caller gets the digest. */
  mine: z.boolean(),
});
export type DigestView = z.infer<typeof DigestView>;
/** PATCH /api/teams/:team/digest (lead) */
export const DigestPatch = z.object({
  isOn: z.boolean().optional(),
  weekday: z.int().min(1).max(7).optional(),
  hour: z.int().min(0).max(23).optional(),
});
/** POST /api/teams/:team/digest/recipients (lead); DELETE .../recipients/:id (lead) */
export const DigestRecipientInput = z.object({ email: Email, name: z.string().trim().max(120).default('') });
/** PUT /api/teams/:team/digest/mine {isOn} (every member) ; POST /api/teams/:team/digest/now sends the caller one now (202 JobRunView) */
export const DigestMine = z.object({ isOn: z.boolean() });

/** GET /api/mailbox (local mailbox only), GET /api/mailbox/:id */
export const MailboxSummary = z.object({
  id: z.int(),
  receivedAt: z.string(),
  from: z.string(),
  to: z.string(),
  subject: z.string(),
});
export type MailboxSummary = z.infer<typeof MailboxSummary>;
export const MailboxMessage = MailboxSummary.extend({
  text: z.string(),
  html: z.string().nullable(),
  headers: z.array(z.object({ name: z.string(), value: z.string() })),
  attachments: z.array(
    z.object({ fileName: z.string(), contentType: z.string(), byteLength: z.int(), dataUrl: z.string() }),
  ),
});
export type MailboxMessage = z.infer<typeof MailboxMessage>;
