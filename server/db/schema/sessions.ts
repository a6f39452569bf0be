import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { moment } from './columns';
import { people } from './people';

/** Sign-in sessions of people across teams, so no team. `personId` lets a person sign out everywhere. */
export const sessions = sqliteTable(
  'sessions',
  {
    sid: text('sid').primaryKey(),
    personId: integer('person_id').references(() => people.id),
    data: text('data').notNull(),
    expiresAt: moment('expires_at').notNull(),
  },
  (table) => [index('sessions_person').on(table.personId), index('sessions_expiry').on(table.expiresAt)],
);
