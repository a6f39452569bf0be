import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { people } from './people';
import { products } from './products';

/** History of the reference build of a product (team through the product). A null build: back to the pooled mean. */
export const referenceChoices = sqliteTable(
  'reference_choices',
  {
    id: rowId(),
    productId: integer('product_id')
      .notNull()
      .references(() => products.id),
    buildId: integer('build_id'),
    chosenBy: integer('chosen_by')
      .notNull()
      .references(() => people.id),
    chosenAt: moment('chosen_at').notNull(),
    reason: text('reason').notNull(),
  },
  (table) => [index('reference_choices_product').on(table.productId, table.chosenAt)],
);
