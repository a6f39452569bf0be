import type { DropEvidence } from '@shared/contracts/drops';
import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { builds } from './builds';
import { rowId } from './columns';
import { drops } from './drops';

/** What is lost in a build: figures of its lead witness. */
export interface SightedLoss {
  differenceDb: number;
  marginDb: number;
  frequencyHz: number;
  isOverLimit: boolean;
  harmonic: DropEvidence['harmonic'];
}

/** What another build than the drop's own says about the drop (team through the drop). */
export const dropSightings = sqliteTable(
  'drop_sightings',
  {
    id: rowId(),
    dropId: integer('drop_id')
      .notNull()
      .references(() => drops.id),
    buildId: integer('build_id')
      .notNull()
      .references(() => builds.id),
    /** Null: the margin is back in this build. */
    loss: text('loss', { mode: 'json' }).$type<SightedLoss>(),
  },
  (table) => [
    uniqueIndex('drop_sightings_place').on(table.dropId, table.buildId),
    index('drop_sightings_build').on(table.buildId),
  ],
);
