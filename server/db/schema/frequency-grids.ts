import { integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { bytes, rowId } from './columns';

/**
 * Frequency axes, each stored once however many sweeps use it. Bare numbers shared by content: no team, and no
 * route reads one but through a sweep.
 */
export const frequencyGrids = sqliteTable(
  'frequency_grids',
  {
    id: rowId(),
    /** SHA-256 of the Float64 little-endian frequencies. */
    hash: text('hash').notNull(),
    pointCount: integer('point_count').notNull(),
    startHz: real('start_hz').notNull(),
    stopHz: real('stop_hz').notNull(),
    medianStepHz: real('median_step_hz').notNull(),
    frequencies: bytes('frequencies').notNull(),
  },
  (table) => [uniqueIndex('frequency_grids_hash').on(table.hash)],
);
