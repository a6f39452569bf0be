import { integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { products } from './products';

/** Single specimens of a product by serial number (team through the product). */
export const units = sqliteTable(
  'units',
  {
    id: rowId(),
    productId: integer('product_id')
      .notNull()
      .references(() => products.id),
    serial: text('serial').notNull(),
    notes: text('notes').notNull().default(''),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [uniqueIndex('units_serial').on(table.productId, table.serial)],
);
