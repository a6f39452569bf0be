import { DROP_STATES } from '@shared/contracts/drops';
import type { DropEvidence } from '@shared/contracts/drops';
import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { builds } from './builds';
import { moment, rowId } from './columns';
import { operatingStates } from './operating-states';
import { people } from './people';
import { products } from './products';
import { teams } from './teams';

/** One flagged loss of margin: a product, build, operating state and band. */
export const drops = sqliteTable(
  'drops',
  {
    id: rowId(),
    teamId: integer('team_id')
      .notNull()
      .references(() => teams.id),
    productId: integer('product_id')
      .notNull()
      .references(() => products.id),
    buildId: integer('build_id')
      .notNull()
      .references(() => builds.id),
    stateId: integer('state_id')
      .notNull()
      .references(() => operatingStates.id),
    band: text('band').notNull(),
    state: text('state', { enum: DROP_STATES }).notNull(),
    /** False once the data no longer show the loss, whatever state somebody gave the drop. */
    isSupported: integer('is_supported', { mode: 'boolean' }).notNull().default(true),
    ownerId: integer('owner_id').references(() => people.id),
    /** Change of margin of the worst witness, negative. */
    differenceDb: real('difference_db').notNull(),
    marginDb: real('margin_db').notNull(),
    frequencyHz: real('frequency_hz').notNull(),
    isOverLimit: integer('is_over_limit', { mode: 'boolean' }).notNull(),
    sentence: text('sentence').notNull(),
    /** Frozen copy of what it was judged on. */
    evidence: text('evidence', { mode: 'json' }).$type<DropEvidence>().notNull(),
    fixedByBuildId: integer('fixed_by_build_id').references(() => builds.id),
    createdAt: moment('created_at').notNull(),
    updatedAt: moment('updated_at').notNull(),
  },
  (table) => [
    uniqueIndex('drops_place').on(table.buildId, table.stateId, table.band),
    index('drops_team_state').on(table.teamId, table.state),
    index('drops_product').on(table.productId),
  ],
);
