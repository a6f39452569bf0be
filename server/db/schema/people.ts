import { integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';

/** People sign in to the installation; teams are joined through memberships, so the table itself has no team. */
export const people = sqliteTable(
  'people',
  {
    id: rowId(),
    /** Lower case; the sign-in name. */
    email: text('email').notNull(),
    name: text('name').notNull(),
    passwordHash: text('password_hash').notNull(),
    isAdministrator: integer('is_administrator', { mode: 'boolean' }).notNull().default(false),
    createdAt: moment('created_at').notNull(),
    disabledAt: moment('disabled_at'),
  },
  (table) => [uniqueIndex('people_email').on(table.email)],
);
