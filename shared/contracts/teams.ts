import { ROLES } from '@shared/access/roles';
import { TOKEN_SCOPES } from '@shared/access/token-scopes';
import * as z from 'zod';
import { Email, Key, Name, TimeZone } from './primitives';

/** GET/PATCH /api/teams/:team */
export const TeamView = z.object({
  key: z.string(),
  name: z.string(),
  timeZone: z.string(),
  targetMarginDb: z.number(),
  thresholdDb: z.number(),
  bands: z.array(z.object({ name: z.string(), fromHz: z.number(), toHz: z.number() })),
  isArchived: z.boolean(),
});
export type TeamView = z.infer<typeof TeamView>;

export const TeamBandInput = z
  .object({ name: Name, fromHz: z.number().min(150e3).max(30e6), toHz: z.number().min(150e3).max(30e6) })
  .refine((band) => band.fromHz < band.toHz, 'a band must end above its start');

function refuseSameNames(bands: readonly { name: string }[], check: z.RefinementCtx): void {
  bands.forEach(({ name }, index) => {
    if (bands.findIndex((band) => band.name === name) === index) return;
    check.addIssue({ code: 'custom', path: [index, 'name'], message: `"${name}" names another band already` });
  });
}

export const TeamPatch = z.object({
  name: Name.optional(),
  timeZone: TimeZone.optional(),
  targetMarginDb: z.number().min(0).max(40).optional(),
  thresholdDb: z.number().min(0.5).max(20).optional(),
  bands: z.array(TeamBandInput).max(12).superRefine(refuseSameNames).optional(),
});
export type TeamPatch = z.infer<typeof TeamPatch>;

/** GET /api/teams/:team/members */
export const MemberView = z.object({
  personId: z.int(),
  name: z.string(),
  email: z.string(),
  role: z.enum(ROLES),
  since: z.string(),
});
export type MemberView = z.infer<typeof MemberView>;
export const PendingInvitation = z.object({
  id: z.int(),
  email: z.string(),
  role: z.enum(ROLES),
  invitedBy: z.string(),
  createdAt: z.string(),
  expiresAt: z.string(),
});
export type PendingInvitation = z.infer<typeof PendingInvitation>;
export const MembersView = z.object({ members: z.array(MemberView), invitations: z.array(PendingInvitation) });
export type MembersView = z.infer<typeof MembersView>;
/** POST /api/teams/:team/invitations; POST .../invitations/:id/resend mails a new link, DELETE .../invitations/:id revokes */
export const InvitationInput = z.object({ email: Email, role: z.enum(ROLES) });
/** PATCH /api/teams/:team/members/:personId; DELETE removes */
export const RoleChange = z.object({ role: z.enum(ROLES) });

/** GET /api/teams/:team/tokens */
export const TokenView = z.object({
  id: z.int(),
  name: z.string(),
  scopes: z.array(z.enum(TOKEN_SCOPES)),
  createdBy: z.string(),
  createdAt: z.string(),
  lastUsedAt: z.string().nullable(),
  revokedAt: z.string().nullable(),
});
export type TokenView = z.infer<typeof TokenView>;
export const TokenInput = z.object({
  name: Name,
  scopes: z.array(z.enum(TOKEN_SCOPES)).min(1, 'choose at least one scope'),
});
/** Answer to POST /api/teams/:team/tokens: the only time the secret is shown. */
export const TokenCreated = TokenView.extend({ token: z.string() });
export type TokenCreated = z.infer<typeof TokenCreated>;

/** Installation: GET/POST /api/installation/teams, PATCH /api/installation/teams/:team */
export const TeamInput = z.object({ key: Key, name: Name, timeZone: TimeZone });
export const InstallationTeam = TeamView.extend({ memberCount: z.int(), productCount: z.int() });
export type InstallationTeam = z.infer<typeof InstallationTeam>;
export const TeamArchive = z.object({ isArchived: z.boolean() });

/** Installation: GET /api/installation/people, PATCH /api/installation/people/:id, PUT {role} or DELETE .../people/:id/memberships/:team */
export const PersonView = z.object({
  id: z.int(),
  name: z.string(),
  email: z.string(),
  isAdministrator: z.boolean(),
  isDisabled: z.boolean(),
  createdAt: z.string(),
  memberships: z.array(z.object({ team: z.string(), teamName: z.string(), role: z.enum(ROLES) })),
});
export type PersonView = z.infer<typeof PersonView>;
export const PersonPatch = z.object({ isAdministrator: z.boolean().optional(), isDisabled: z.boolean().optional() });
