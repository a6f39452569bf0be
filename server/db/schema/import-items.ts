import type { BatchItemTags } from '@shared/contracts/imports';
import type { Problem } from '@shared/contracts/problem';
import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { importBatches } from './import-batches';
import { rowId } from './columns';
import { sweeps } from './sweeps';

export const IMPORT_ITEM_STATUSES = ['waiting', 'imported', 'duplicate', 'refused'] as const;

/** One trace of one file of a batch (team through the batch). The bytes are already kept as an original. */
export const importItems = sqliteTable(
  'import_items',
  {
    id: rowId(),
    batchId: integer('batch_id')
      .notNull()
      .references(() => importBatches.id),
    fileName: text('file_name').notNull(),
    originalSha256: text('original_sha256').notNull(),
    /** Tags of this trace, laid over those of the batch. */
    tags: text('tags', { mode: 'json' }).$type<BatchItemTags>().notNull(),
    status: text('status', { enum: IMPORT_ITEM_STATUSES }).notNull().default('waiting'),
    sweepId: integer('sweep_id').references(() => sweeps.id),
    problem: text('problem', { mode: 'json' }).$type<Problem>(),
  },
  (table) => [index('import_items_batch').on(table.batchId, table.status)],
);
