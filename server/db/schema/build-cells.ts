import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { builds } from './builds';
import { bytes } from './columns';

/** Which series a row of the tile belongs to. */
export interface CellSeries {
  stateId: number;
  line: string;
  detector: string;
  /** All its sweeps are superseded: counted only where somebody asks for this detector. */
  isSuperseded: boolean;
}

/**
 * The margin map's row of a build (team through the build): a cache that can be rebuilt from the sweeps.
 * `cells` is the worst margin of every cell over all product sweeps that are not superseded; `tile` the same per series, one after another
 * in the order of `series`. Both Int16 little-endian, hundredths of a dB, -32768 where nothing was measured.
 */
export const buildCells = sqliteTable('build_cells', {
  buildId: integer('build_id')
    .primaryKey()
    .references(() => builds.id),
  series: text('series', { mode: 'json' }).$type<CellSeries[]>().notNull(),
  cells: bytes('cells').notNull(),
  tile: bytes('tile').notNull(),
});
