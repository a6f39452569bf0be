import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { teams } from './teams';

/** What a team was told in a week. */
export const digests = sqliteTable(
  'digests',
  {
    id: rowId(),
    teamId: integer('team_id')
      .notNull()
      .references(() => teams.id),
    /** ISO week in the team's zone, `2026-W49`; for one asked for by hand `now-<run id>`. */
    period: text('period').notNull(),
    subject: text('subject').notNull(),
    text: text('text').notNull(),
    html: text('html').notNull(),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [
    uniqueIndex('digests_period').on(table.teamId, table.period),
    index('digests_team').on(table.teamId, table.createdAt),
  ],
);
