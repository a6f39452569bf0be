import { simpleParser } from 'mailparser';
import type { AddressInfo } from 'node:net';
import { buffer } from 'node:stream/consumers';
import { SMTPServer, type SMTPServerSession } from 'smtp-server';
import type { Context } from '../context';
import { insertMessage } from './mailbox-store';

export interface Mailbox {
  readonly port: number;
  close(): Promise<void>;
}

/**
 * Opens the mailbox of development and demo: an SMTP server on this machine alone that keeps what it is given. Undefined
 * where the installation has a real mail server.
 *
 * @throws Error in one line when the port is taken
 */
export async function openMailbox(context: Context): Promise<Mailbox | undefined> {
  const { mail } = context.config;
  if (mail.kind !== 'local') return undefined;
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    disableReverseLookup: true,
    onData: (stream, session, done) => {
      buffer(stream)
        .then((raw) => keep(context, raw, session))
        .then(
          () => done(),
          (error: unknown) => done(error instanceof Error ? error : new Error(String(error))),
        );
    },
  });
  const port = await listenLocally(server, mail.port);
  server.on('error', (error) => context.log.warn({ err: error }, 'a connection to the local mailbox broke'));
  return { port, close: () => new Promise((resolve) => server.close(() => resolve())) };
}

function listenLocally(server: SMTPServer, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    const refuse = (error: Error & { code?: string }): void => {
      const isTaken = error.code === 'EADDRINUSE';
      reject(isTaken ? new Error(`MAILBOX_PORT: port ${port} of 127.0.0.1 is taken; choose another or 0`) : error);
    };
    server.once('error', refuse);
    server.listen(port, '127.0.0.1', () => {
      server.off('error', refuse);
      resolve((server.server.address() as AddressInfo).port);
    });
  });
}

async function keep(context: Context, raw: Buffer, { envelope }: SMTPServerSession): Promise<void> {
  const { subject, from } = await simpleParser(raw, { skipHtmlToText: true, skipTextToHtml: true });
  insertMessage(context.db, {
    receivedAt: context.now(),
    fromAddress: from?.text ?? (envelope.mailFrom ? envelope.mailFrom.address : ''),
    toAddress: envelope.rcptTo.map(({ address }) => address).join(', '),
    subject: subject ?? '',
    raw,
  });
}
