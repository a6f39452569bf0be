import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';

export const ACTOR_KINDS = ['person', 'token', 'job'] as const;

/**
 * What was changed, by whom. No foreign keys: an entry outlives what it tells of.
 * `teamId` is null for acts on the installation itself.
 */
export const auditEntries = sqliteTable(
  'audit_entries',
  {
    id: rowId(),
    teamId: integer('team_id'),
    at: moment('at').notNull(),
    actorKind: text('actor_kind', { enum: ACTOR_KINDS }).notNull(),
    actorId: integer('actor_id'),
    actorName: text('actor_name').notNull(),
    /** `<subject>.<verb in past tense>`, such as `drop.moved`. */
    action: text('action').notNull(),
    subjectKind: text('subject_kind').notNull(),
    subjectId: text('subject_id').notNull(),
    /** One sentence for a reader. */
    summary: text('summary').notNull(),
    /** Old and new values, JSON. */
    details: text('details', { mode: 'json' }).$type<Record<string, unknown>>().notNull().default({}),
  },
  (table) => [index('audit_entries_team').on(table.teamId, table.at)],
);
