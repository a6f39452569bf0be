import { ROLES } from '@shared/access/roles';
import * as z from 'zod';
import { Email, Name, Password } from './primitives';

export const SessionTeam = z.object({
  key: z.string(),
  name: z.string(),
  role: z.enum(ROLES),
  timeZone: z.string(),
  targetMarginDb: z.number(),
});
export type SessionTeam = z.infer<typeof SessionTeam>;

/** GET /api/session */
export const SessionView = z
  .object({
    person: z.object({ id: z.int(), name: z.string(), email: z.string(), isAdministrator: z.boolean() }).nullable(),
    teams: z.array(SessionTeam),
    demo: z.boolean().describe('whether this installation shows the demo and its sign-ins'),
    mailbox: z.boolean().describe('whether mail goes to the local mailbox'),
    demoSignIns: z.array(z.object({ email: z.string(), name: z.string(), role: z.string(), password: z.string() })),
  })
  .meta({ id: 'Session' });
export type SessionView = z.infer<typeof SessionView>;

export const SignIn = z.object({ email: Email, password: z.string().min(1).max(200) });
export const ResetRequest = z.object({ email: Email });
export const NewPassword = z.object({ password: Password });
export const PasswordChange = z.object({ current: z.string().min(1).max(200), next: Password });

/** GET /api/invitations/:token */
export const InvitationView = z.object({
  email: z.string(),
  teamName: z.string(),
  role: z.enum(ROLES),
  /** A person with this e-mail exists already and only needs to accept. */
  isKnown: z.boolean(),
});
export type InvitationView = z.infer<typeof InvitationView>;
/** POST /api/invitations/:token; name and password are needed from a new person only. */
export const InvitationAnswer = z.object({ name: Name.optional(), password: Password.optional() });
