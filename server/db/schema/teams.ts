import { integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';

export interface TeamBand {
  name: string;
  fromHz: number;
  toHz: number;
}

export const teams = sqliteTable(
  'teams',
  {
    id: rowId(),
    key: text('key').notNull(),
    name: text('name').notNull(),
    /** IANA name; the digest's clock and the zone times are shown in. */
    timeZone: text('time_zone').notNull(),
    targetMarginDb: real('target_margin_db').notNull().default(6),
    /** Smallest change that is called lost or gained. */
    thresholdDb: real('threshold_db').notNull().default(2),
    bands: text('bands', { mode: 'json' }).$type<TeamBand[]>().notNull().default([]),
    createdAt: moment('created_at').notNull(),
    isArchived: integer('is_archived', { mode: 'boolean' }).notNull().default(false),
  },
  (table) => [uniqueIndex('teams_key').on(table.key)],
);
