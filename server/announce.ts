import type { Context } from './context';
import { demoSignIns } from './demo/demo-sign-ins';

/** Tells the person who started the server where it is and, with the demo, how to sign in. */
export function announce(context: Context, url: string): void {
  const people = demoSignIns(context);
  const width = Math.max(0, ...people.map(({ email }) => email.length));
  const lines = [
    `Strandline is at ${url}`,
    ...(context.config.mail.kind === 'local' ? [`Mail stays on this machine: ${url}/mailbox`] : []),
    ...people.slice(0, 1).map(({ password }) => `Sign in to the demo with the password ${password} as`),
    ...people.map(({ email, role }) => `  ${email.padEnd(width)}  ${role}`),
  ];
  console.log(lines.join('\n'));
}
