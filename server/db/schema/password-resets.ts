import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { people } from './people';

/** Belongs to a person, who may be in several teams, so it has no team. */
export const passwordResets = sqliteTable(
  'password_resets',
  {
    id: rowId(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    tokenHash: text('token_hash').notNull(),
    createdAt: moment('created_at').notNull(),
    expiresAt: moment('expires_at').notNull(),
    usedAt: moment('used_at'),
  },
  (table) => [
    uniqueIndex('password_resets_token').on(table.tokenHash),
    index('password_resets_person').on(table.personId),
  ],
);
