import { blob, integer } from 'drizzle-orm/sqlite-core';

/** Surrogate key: a row number that is never given out twice. */
export const rowId = () => integer('id').primaryKey({ autoIncrement: true });

/** A moment as UTC milliseconds since 1970. */
export const moment = (name: string) => integer(name);

/** Bytes; better-sqlite3 hands them out as a Buffer. */
export const bytes = (name: string) => blob(name, { mode: 'buffer' });
