import { ROLES } from '@shared/access/roles';
import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { people } from './people';
import { teams } from './teams';

export const invitations = sqliteTable(
  'invitations',
  {
    id: rowId(),
    teamId: integer('team_id')
      .notNull()
      .references(() => teams.id),
    email: text('email').notNull(),
    role: text('role', { enum: ROLES }).notNull(),
    /** SHA-256 of the random secret in the link; the secret itself is only in the e-mail. */
    tokenHash: text('token_hash').notNull(),
    invitedBy: integer('invited_by')
      .notNull()
      .references(() => people.id),
    createdAt: moment('created_at').notNull(),
    expiresAt: moment('expires_at').notNull(),
    acceptedAt: moment('accepted_at'),
    revokedAt: moment('revoked_at'),
  },
  (table) => [uniqueIndex('invitations_token').on(table.tokenHash), index('invitations_team').on(table.teamId)],
);
