import { desc, eq } from 'drizzle-orm';
import type { Context } from '../../server/context';
import { outboxMails } from '../../server/db/schema';

/** The secret at the end of the link in the newest mail to somebody, or undefined when there is no such mail. */
export function secretMailedTo(context: Context, email: string): string | undefined {
  const mail = context.db
    .select({ text: outboxMails.text })
    .from(outboxMails)
    .where(eq(outboxMails.toEmail, email))
    .orderBy(desc(outboxMails.id))
    .limit(1)
    .get();
  return /\/(?:reset|invitation)\/([\w-]+)/.exec(mail?.text ?? '')?.[1];
}
