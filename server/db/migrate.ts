import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { migrate as runMigrations } from 'drizzle-orm/better-sqlite3/migrator';
import * as z from 'zod';
import type { Database } from './open-database';

const MIGRATIONS = resolve('migrations');
const Journal = z.object({ entries: z.array(z.object({ when: z.number() })) });

/**
 * Brings the database to the newest schema, then turns foreign keys on.
 *
 * @param folder of the migrations; a test gives its own
 * @throws Error when the database is of a newer program, or rows break a foreign key afterwards
 */
export function migrate(database: Database, folder = MIGRATIONS): void {
  database.$client.pragma('foreign_keys = OFF');
  runMigrations(database, { migrationsFolder: folder });
  if (newestMigration(folder) !== appliedMigration(database))
    throw new Error(
      'the database was migrated by a newer version of this program: start that one, or go back to a backup',
    );
  const broken = database.$client.pragma('foreign_key_check') as unknown[];
  if (broken.length > 0)
    throw new Error(`the migration left ${broken.length} rows that point nowhere: ${JSON.stringify(broken[0])}`);
  database.$client.pragma('foreign_keys = ON');
}

/**
 * Turns foreign keys on if the database has the newest schema; a process that does not migrate calls this instead.
 *
 * @throws Error when the schema is older or newer than this program's
 */
export function requireCurrentSchema(database: Database): void {
  if (newestMigration(MIGRATIONS) !== appliedMigration(database)) {
    throw new Error('the database does not have the schema of this program: start the web server first, it migrates');
  }
  database.$client.pragma('foreign_keys = ON');
}

function newestMigration(folder: string): number | undefined {
  return Journal.parse(JSON.parse(readFileSync(resolve(folder, 'meta/_journal.json'), 'utf8'))).entries.at(-1)?.when;
}

function appliedMigration(database: Database): number | undefined {
  const table = database.$client.prepare("select 1 from sqlite_master where name = '__drizzle_migrations'").get();
  if (table === undefined) return undefined;
  const row = database.$client.prepare('select max(created_at) as newest from __drizzle_migrations').get() as {
    newest: number | null;
  };
  return row.newest ?? undefined;
}
