import { Email, Name, Password } from '@shared/contracts/primitives';
import { randomBytes } from 'node:crypto';
import { text } from 'node:stream/consumers';
import { parseArgs } from 'node:util';
import { readConfig } from '../config/read-config';
import { createContext } from '../context';
import { requireCurrentSchema } from '../db/migrate';
import { issuePasswordReset } from './issue-password-reset';
import { makeAdministrator } from './make-administrator';
import { hashPassword } from './password-hash';

/*
 * Makes the first administrator of a new installation, or brings a locked-out one back. Run it where the server runs, with
 * the server's environment, once the server has started for the first time:
 *
 *   node --import tsx server/accounts/create-administrator.ts --email ada@lab.example --name "Ada Vane"
 *
 * prints a link to set the password with, good once and for a day. With --password-stdin the password is read from the
 * standard input instead, one line of at least 12 characters, and no link is made:
 *
 *   node --import tsx server/accounts/create-administrator.ts --email ada@lab.example --name "Ada Vane" --password-stdin < file
 */

const LINK_VALID_MS = 24 * 3600_000;

const { values } = parseArgs({
  options: {
    email: { type: 'string' },
    name: { type: 'string' },
    'password-stdin': { type: 'boolean', default: false },
  },
});
const email = Email.safeParse(values.email);
const name = Name.safeParse(values.name);
const given = values['password-stdin'] ? (await text(process.stdin)).replace(/\r?\n$/, '') : undefined;
const password = Password.optional().safeParse(given);
if (email.success && name.success && password.success) await create(email.data, name.data, password.data);
else {
  process.stderr.write('Give --email and --name, and with --password-stdin a password of at least 12 characters.\n');
  process.exitCode = 2;
}

async function create(email: string, name: string, password: string | undefined): Promise<void> {
  const context = createContext(readConfig(process.env), 'create-administrator');
  requireCurrentSchema(context.db);
  const actor = { kind: 'job', name: 'create-administrator' } as const;
  const passwordHash = await hashPassword(password ?? randomBytes(32).toString('base64url'));
  const personId = makeAdministrator(context, actor, { email, name, passwordHash });
  process.stdout.write(`${email} is an administrator.\n`);
  if (password === undefined) {
    const { url } = issuePasswordReset(context, personId, LINK_VALID_MS);
    process.stdout.write(`Set the password here, once and within a day: ${url}\n`);
  }
  context.close();
}
