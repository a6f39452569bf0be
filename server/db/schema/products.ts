import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { teams } from './teams';

export const products = sqliteTable(
  'products',
  {
    id: rowId(),
    teamId: integer('team_id')
      .notNull()
      .references(() => teams.id),
    key: text('key').notNull(),
    name: text('name').notNull(),
    description: text('description').notNull().default(''),
    /** The limit plan: a limit set of `shared/limits`, its QP and AV lines both required. */
    limitSetKey: text('limit_set_key').notNull(),
    /** Null: the team's target margin. */
    targetMarginDb: real('target_margin_db'),
    /** The newest build by position, so that an overview of many products reads one row each. */
    latestBuildId: integer('latest_build_id'),
    /** The reference the team chose; null: the pooled mean of builds judged held. */
    referenceBuildId: integer('reference_build_id'),
    createdAt: moment('created_at').notNull(),
    archivedAt: moment('archived_at'),
  },
  (table) => [uniqueIndex('products_key').on(table.teamId, table.key), index('products_team').on(table.teamId)],
);
