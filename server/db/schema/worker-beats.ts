import { sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { moment } from './columns';

/** When each worker of the jobs process was last seen; no team, it serves the installation. */
export const workerBeats = sqliteTable('worker_beats', {
  worker: text('worker').primaryKey(),
  startedAt: moment('started_at').notNull(),
  seenAt: moment('seen_at').notNull(),
});
