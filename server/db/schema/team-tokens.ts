import type { TokenScope } from '@shared/access/token-scopes';
import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { people } from './people';
import { teams } from './teams';

/** Tokens of benches and pipelines, written `strand_<id>_<secret>`; only the secret's SHA-256 is kept. */
export const teamTokens = sqliteTable(
  'team_tokens',
  {
    id: rowId(),
    teamId: integer('team_id')
      .notNull()
      .references(() => teams.id),
    name: text('name').notNull(),
    secretHash: text('secret_hash').notNull(),
    scopes: text('scopes', { mode: 'json' }).$type<TokenScope[]>().notNull(),
    createdBy: integer('created_by')
      .notNull()
      .references(() => people.id),
    createdAt: moment('created_at').notNull(),
    lastUsedAt: moment('last_used_at'),
    revokedAt: moment('revoked_at'),
  },
  (table) => [index('team_tokens_team').on(table.teamId)],
);
