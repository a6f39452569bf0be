import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { queueMail } from '../mail/queue-mail';
import { renderLetter } from '../mail/render-letter';
import { issuePasswordReset } from './issue-password-reset';
import { findPersonByEmail } from './person-store';

const VALID_MS = 3600_000;

/** Mails a link to set a new password. Does nothing for somebody unknown or disabled, and the caller cannot tell. */
export function requestPasswordReset(context: Context, email: string): void {
  const person = findPersonByEmail(context.db, email);
  if (person === undefined || person.disabledAt !== null) return;
  withTransaction(context.db, () => {
    const { resetId, url } = issuePasswordReset(context, person.id, VALID_MS);
    const letter = renderLetter({
      heading: 'Set a new password',
      paragraphs: [
        `Hello ${person.name}, somebody asked for a new password for your sign-in to Strandline.`,
        'The link works once, within one hour. When you set a password with it, every session of yours is signed out.',
      ],
      link: { label: 'Set a new password', url },
      footer: 'If it was not you, do nothing: your password stays as it is.',
    });
    queueMail(context, {
      teamId: null,
      kind: 'passwordReset',
      onceKey: `passwordReset:${resetId}`,
      toEmail: person.email,
      subject: 'Set a new password for Strandline',
      ...letter,
    });
  });
}
