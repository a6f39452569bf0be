import { createTransport, type Transporter } from 'nodemailer';
import type { Context } from '../context';

/** Together well below the shortest wait between two attempts, so that a mail is never on its way twice. */
const TIMEOUTS = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 30_000 };

/** The way out for mail: the installation's SMTP server, or the local mailbox. */
export function openTransport({ config: { mail } }: Context): Transporter {
  const server =
    mail.kind === 'smtp' ? { url: mail.url } : { host: '127.0.0.1', port: mail.port, secure: false, ignoreTLS: true };
  return createTransport({ ...server, ...TIMEOUTS, disableFileAccess: true, disableUrlAccess: true });
}
