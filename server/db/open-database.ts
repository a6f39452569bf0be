import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import SqliteDatabase from 'better-sqlite3';
import { type BetterSQLite3Database, drizzle } from 'drizzle-orm/better-sqlite3';
import * as schema from './schema';

export type Database = BetterSQLite3Database<typeof schema> & { $client: SqliteDatabase.Database };

/** 1 GiB of address space: traces are read from the page cache without a copy through SQLite's own. */
const MMAP_BYTES = 1024 * 1024 * 1024;

/**
 * Opens the database with the settings every connection needs. Foreign keys stay off until `migrate` has run or
 * `requireCurrentSchema` has passed: a table rebuild inside a migration would otherwise delete child rows.
 *
 * @param file path of the database file, or ':memory:'
 */
export function openDatabase(file: string): Database {
  if (file !== ':memory:') mkdirSync(dirname(file), { recursive: true });
  const client = new SqliteDatabase(file);
  client.pragma('journal_mode = WAL');
  client.pragma('synchronous = NORMAL');
  client.pragma('busy_timeout = 10000');
  client.pragma(`mmap_size = ${MMAP_BYTES}`);
  client.pragma('foreign_keys = OFF');
  return drizzle(client, { schema });
}
