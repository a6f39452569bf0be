import { index, integer, primaryKey, sqliteTable } from 'drizzle-orm/sqlite-core';
import { moment } from './columns';
import { people } from './people';
import { products } from './products';
import { teams } from './teams';

/** `teamId` may read the product's results though another team owns it. */
export const productShares = sqliteTable(
  'product_shares',
  {
    productId: integer('product_id')
      .notNull()
      .references(() => products.id),
    teamId: integer('team_id')
      .notNull()
      .references(() => teams.id),
    sharedBy: integer('shared_by')
      .notNull()
      .references(() => people.id),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [primaryKey({ columns: [table.productId, table.teamId] }), index('product_shares_team').on(table.teamId)],
);
