import { integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';
import { products } from './products';

/** Supply, load and mode a product is measured in (team through the product). */
export const operatingStates = sqliteTable(
  'operating_states',
  {
    id: rowId(),
    productId: integer('product_id')
      .notNull()
      .references(() => products.id),
    name: text('name').notNull(),
    supplyVoltageV: real('supply_voltage_v'),
    /** 0 for a direct-current supply. */
    supplyFrequencyHz: real('supply_frequency_hz'),
    load: text('load').notNull().default(''),
    mode: text('mode').notNull().default(''),
    /** Whether every build has to be measured in this state (an unmeasured one is reported). */
    isRequired: integer('is_required', { mode: 'boolean' }).notNull().default(true),
    position: integer('position').notNull(),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [uniqueIndex('operating_states_name').on(table.productId, table.name)],
);
