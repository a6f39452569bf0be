import { integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { teams } from './teams';

export const benches = sqliteTable(
  'benches',
  {
    id: rowId(),
    teamId: integer('team_id')
      .notNull()
      .references(() => teams.id),
    key: text('key').notNull(),
    name: text('name').notNull(),
    location: text('location').notNull().default(''),
    lisn: text('lisn').notNull().default(''),
    receiver: text('receiver').notNull().default(''),
    notes: text('notes').notNull().default(''),
    createdAt: moment('created_at').notNull(),
    archivedAt: moment('archived_at'),
  },
  (table) => [uniqueIndex('benches_key').on(table.teamId, table.key)],
);
