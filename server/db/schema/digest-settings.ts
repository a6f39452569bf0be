import { integer, sqliteTable } from 'drizzle-orm/sqlite-core';
import { teams } from './teams';

export const digestSettings = sqliteTable('digest_settings', {
  teamId: integer('team_id')
    .primaryKey()
    .references(() => teams.id),
  isOn: integer('is_on', { mode: 'boolean' }).notNull().default(true),
  /** 1 Monday ... 7 Sunday, in the team's time zone. */
  weekday: integer('weekday').notNull().default(1),
  /** 0-23, in the team's time zone. */
  hour: integer('hour').notNull().default(7),
});
