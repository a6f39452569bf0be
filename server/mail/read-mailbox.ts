import type { Actor } from '../actor';
import type { Context } from '../context';
import { requireAdministrator } from '../require-permission';
import { ServiceError } from '../service-error';
import { findMessage, listMessages, type MailboxRow } from './mailbox-store';

const SHOWN = 200;
const LOOPBACK = ['127.0.0.1', '::1', 'localhost'];

export function readMailbox(context: Context, actor: Actor | undefined): Omit<MailboxRow, 'raw'>[] {
  requireReader(context, actor);
  return listMessages(context.db, SHOWN);
}

export function readMessage(context: Context, actor: Actor | undefined, id: number): MailboxRow {
  requireReader(context, actor);
  const message = findMessage(context.db, id);
  if (message === undefined) throw new ServiceError('notFound', `the mailbox has no message ${id}`);
  return message;
}

/**
 * Nobody need sign in: the mailbox exists on an installation for development or the demo only, which listens on the loopback
 * and so answers whoever sits at the machine and could read its database as well; and who forgot the password or was
 * invited must reach the link. Such an installation opened to a network by HOST gives these links to administrators alone.
 */
function requireReader(context: Context, actor: Actor | undefined): void {
  const { mail, host } = context.config;
  if (mail.kind !== 'local') throw new ServiceError('notFound', 'this installation sends mail and keeps no mailbox');
  if (LOOPBACK.includes(host)) return;
  if (actor === undefined) throw new ServiceError('signedOut', 'sign in as an administrator to read the mailbox');
  requireAdministrator(actor);
}
