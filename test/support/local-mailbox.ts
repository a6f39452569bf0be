import type { Context } from '../../server/context';
import { type Mailbox, openMailbox } from '../../server/mail/open-mailbox';
import { sendDueMail } from '../../server/mail/send-due-mail';
import { claimRun } from '../../server/queue/claim-run';
import { HeldRun } from '../../server/queue/held-run';

/** The context with a local mailbox on a free port that it sends to. */
export async function withLocalMailbox<Given extends Context>(
  context: Given,
): Promise<{ context: Given; mailbox: Mailbox }> {
  const mail = { kind: 'local', port: 0 } as const;
  const mailbox = await openMailbox({ ...context, config: { ...context.config, mail } });
  if (mailbox === undefined) throw new Error('the local mailbox did not open');
  return {
    context: { ...context, config: { ...context.config, mail: { kind: 'local', port: mailbox.port } } },
    mailbox,
  };
}

/** Sends what waits in the outbox as the jobs process would. */
export async function sendWaitingMail(context: Context): Promise<void> {
  const run = claimRun(context, 'test', ['mail']);
  if (run === undefined) return;
  const held = new HeldRun(context, run, 'test');
  await sendDueMail(context, held);
  held.finish();
}
