import { integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { products } from './products';

/** The product's firmware revisions in the order they appeared (team through the product). */
export const firmwareRevisions = sqliteTable(
  'firmware_revisions',
  {
    id: rowId(),
    productId: integer('product_id')
      .notNull()
      .references(() => products.id),
    name: text('name').notNull(),
    /** 1, 2, 3 ... oldest first. */
    position: integer('position').notNull(),
    /** Commit of the firmware's repository, free text. */
    commit: text('commit').notNull().default(''),
    notes: text('notes').notNull().default(''),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [uniqueIndex('firmware_revisions_name').on(table.productId, table.name)],
);
