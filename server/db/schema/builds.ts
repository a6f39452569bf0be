import type { SwitchingStage } from '@shared/contracts/switching';
import { VERDICTS } from '@shared/judging/verdict';
import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { firmwareRevisions } from './firmware-revisions';
import { hardwareRevisions } from './hardware-revisions';
import { products } from './products';

export interface BuildParameter {
  name: string;
  value: string;
}

/** One pair of hardware and firmware revision (team through the product). */
export const builds = sqliteTable(
  'builds',
  {
    id: rowId(),
    productId: integer('product_id')
      .notNull()
      .references(() => products.id),
    hardwareId: integer('hardware_id')
      .notNull()
      .references(() => hardwareRevisions.id),
    firmwareId: integer('firmware_id')
      .notNull()
      .references(() => firmwareRevisions.id),
    /** 1, 2, 3 ... by `builtAt`, oldest first; the order of trends and maps. */
    position: integer('position').notNull(),
    builtAt: moment('built_at').notNull(),
    notes: text('notes').notNull().default(''),
    switching: text('switching', { mode: 'json' }).$type<SwitchingStage[]>().notNull().default([]),
    /** What was changed against the build before, as the team words it. */
    parameters: text('parameters', { mode: 'json' }).$type<BuildParameter[]>().notNull().default([]),
    createdAt: moment('created_at').notNull(),

    // Roll-up of the product sweeps, rewritten with every import and deletion (server/margins/roll-up-build.ts).
    sweepCount: integer('sweep_count').notNull().default(0),
    worstMarginDb: real('worst_margin_db'),
    worstFrequencyHz: real('worst_frequency_hz'),
    worstSweepId: integer('worst_sweep_id'),

    // Judgement: stale while dataVersion > judgedVersion.
    dataVersion: integer('data_version').notNull().default(0),
    judgedVersion: integer('judged_version').notNull().default(0),
    /** Outcome over all bands and states, as `server/judging/build-verdict.ts` says; null: not judged yet. */
    verdict: text('verdict', { enum: VERDICTS }),
    judgedAt: moment('judged_at'),
  },
  (table) => [
    uniqueIndex('builds_revisions').on(table.productId, table.hardwareId, table.firmwareId),
    index('builds_position').on(table.productId, table.position),
  ],
);
