import { integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { people } from './people';
import { teams } from './teams';

/** Who gets the digest: members (with `personId`) and addresses outside. */
export const digestRecipients = sqliteTable(
  'digest_recipients',
  {
    id: rowId(),
    teamId: integer('team_id')
      .notNull()
      .references(() => teams.id),
    personId: integer('person_id').references(() => people.id),
    email: text('email').notNull(),
    name: text('name').notNull().default(''),
    /** Random, part of the one-click unsubscribe link. */
    unsubscribeSecret: text('unsubscribe_secret').notNull(),
    createdAt: moment('created_at').notNull(),
    unsubscribedAt: moment('unsubscribed_at'),
  },
  (table) => [
    uniqueIndex('digest_recipients_email').on(table.teamId, table.email),
    uniqueIndex('digest_recipients_secret').on(table.unsubscribeSecret),
  ],
);
