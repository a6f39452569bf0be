import { DROP_EVENT_KINDS } from '@shared/contracts/drops';
import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { ACTOR_KINDS } from './audit-entries';
import { moment, rowId } from './columns';
import { drops } from './drops';

/** A drop's dated history (team through the drop). */
export const dropEvents = sqliteTable(
  'drop_events',
  {
    id: rowId(),
    dropId: integer('drop_id')
      .notNull()
      .references(() => drops.id),
    at: moment('at').notNull(),
    actorKind: text('actor_kind', { enum: ACTOR_KINDS }).notNull(),
    actorName: text('actor_name').notNull(),
    kind: text('kind', { enum: DROP_EVENT_KINDS }).notNull(),
    /** What a reader should see: the note itself, or the change in words. */
    text: text('text').notNull(),
  },
  (table) => [index('drop_events_drop').on(table.dropId, table.at)],
);
