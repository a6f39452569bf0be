import type { BatchTags } from '@shared/contracts/imports';
import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { people } from './people';
import { teams } from './teams';

/** Many files handed over at once; the jobs process works through them, so that a reload or a restart loses nothing. */
export const importBatches = sqliteTable(
  'import_batches',
  {
    id: rowId(),
    teamId: integer('team_id')
      .notNull()
      .references(() => teams.id),
    createdBy: integer('created_by')
      .notNull()
      .references(() => people.id),
    createdAt: moment('created_at').notNull(),
    tags: text('tags', { mode: 'json' }).$type<BatchTags>().notNull(),
    finishedAt: moment('finished_at'),
  },
  (table) => [index('import_batches_team').on(table.teamId, table.createdAt)],
);
