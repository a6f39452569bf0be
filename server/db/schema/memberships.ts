import { ROLES } from '@shared/access/roles';
import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { moment } from './columns';
import { people } from './people';
import { teams } from './teams';

export const memberships = sqliteTable(
  'memberships',
  {
    teamId: integer('team_id')
      .notNull()
      .references(() => teams.id),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    role: text('role', { enum: ROLES }).notNull(),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [primaryKey({ columns: [table.teamId, table.personId] }), index('memberships_person').on(table.personId)],
);
