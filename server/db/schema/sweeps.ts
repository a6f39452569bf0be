import { DETECTORS, LINES, SWEEP_KINDS } from '@shared/detectors/detectors';
import type { BandMargin } from '@shared/traces/margins';
import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { ACTOR_KINDS } from './audit-entries';
import { benches } from './benches';
import { builds } from './builds';
import { bytes, moment, rowId } from './columns';
import { frequencyGrids } from './frequency-grids';
import { operatingStates } from './operating-states';
import { products } from './products';
import { teams } from './teams';
import { units } from './units';

export const CORRECTION_STATES = ['inFile', 'none'] as const;

/** Something the reader of a sweep should know; never stops an import. */
export interface SweepRemark {
  code: string;
  text: string;
}

/** One trace: build, unit, state, bench, line, detector, time. The levels are in `sweep_traces`. */
export const sweeps = sqliteTable(
  'sweeps',
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
    /** Null: the tags named no unit. */
    unitId: integer('unit_id').references(() => units.id),
    benchId: integer('bench_id')
      .notNull()
      .references(() => benches.id),
    line: text('line', { enum: LINES }).notNull(),
    detector: text('detector', { enum: DETECTORS }).notNull(),
    kind: text('kind', { enum: SWEEP_KINDS }).notNull(),
    takenAt: moment('taken_at').notNull(),
    /** Sweeps taken together: same build, unit, bench, state, session. */
    run: text('run').notNull(),
    rbwHz: real('rbw_hz'),
    attenuationDb: real('attenuation_db'),
    correction: text('correction', { enum: CORRECTION_STATES }).notNull(),
    gridId: integer('grid_id')
      .notNull()
      .references(() => frequencyGrids.id),

    originalSha256: text('original_sha256').notNull(),
    fileName: text('file_name').notNull(),
    /** Which level column of the file, 1 first. */
    traceNumber: integer('trace_number').notNull(),
    frequencyUnit: text('frequency_unit').notNull(),
    levelUnit: text('level_unit').notNull(),
    /** SHA-256 of file and tags: the same file with the same tags is one sweep. */
    identity: text('identity').notNull(),
    /** SHA-256 of the levels: two sweeps with equal numbers are one reading exported twice. */
    readingHash: text('reading_hash').notNull(),
    remarks: text('remarks', { mode: 'json' }).$type<SweepRemark[]>().notNull().default([]),

    limitSetKey: text('limit_set_key').notNull(),
    limitSetVersion: integer('limit_set_version').notNull(),
    worstMarginDb: real('worst_margin_db'),
    worstFrequencyHz: real('worst_frequency_hz'),
    worstLevelDbuv: real('worst_level_dbuv'),
    worstLimitDbuv: real('worst_limit_dbuv'),
    /** A PK sweep whose state and line were measured with QP over the same range: the QP reading decides. */
    isSuperseded: integer('is_superseded', { mode: 'boolean' }).notNull().default(false),
    bands: text('bands', { mode: 'json' }).$type<BandMargin[]>().notNull(),
    /** Int16 little-endian, hundredths of a dB, one a cell of `shared/limits/cells.ts`. */
    cells: bytes('cells').notNull(),

    importedAt: moment('imported_at').notNull(),
    importedByKind: text('imported_by_kind', { enum: ACTOR_KINDS }).notNull(),
    importedById: integer('imported_by_id'),
    importedByName: text('imported_by_name').notNull(),
    batchId: integer('batch_id'),
  },
  (table) => [
    uniqueIndex('sweeps_identity').on(table.productId, table.identity),
    index('sweeps_build').on(table.buildId, table.kind),
    // Covers the trend: no sweep row is read for it.
    index('sweeps_trend').on(
      table.productId,
      table.kind,
      table.buildId,
      table.isSuperseded,
      table.stateId,
      table.line,
      table.detector,
      table.run,
      table.benchId,
      table.unitId,
      table.worstMarginDb,
      table.worstFrequencyHz,
    ),
    index('sweeps_product_taken').on(table.productId, table.takenAt),
    index('sweeps_bench_taken').on(table.benchId, table.takenAt),
    index('sweeps_team_imported').on(table.teamId, table.importedAt),
    index('sweeps_reading').on(table.productId, table.readingHash),
    index('sweeps_original').on(table.originalSha256),
  ],
);
