import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { bytes } from './columns';
import { sweeps } from './sweeps';

/** The levels of a sweep, in a table of their own so that lists of sweeps never read them (team through the sweep). */
export const sweepTraces = sqliteTable('sweep_traces', {
  sweepId: integer('sweep_id')
    .primaryKey()
    .references(() => sweeps.id),
  /** `i16`: hundredths of a dBuV, bytes split, deflated; `f32`: Float32 dBuV where hundredths would lose digits. */
  encoding: text('encoding', { enum: ['i16', 'f32'] }).notNull(),
  levels: bytes('levels').notNull(),
});
