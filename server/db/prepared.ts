import type { Database } from './open-database';

/**
 * A statement that is put together and compiled once for a database. For the few that every import runs: putting one
 * together anew takes several times as long as running it.
 *
 * @param prepare makes the statement, with `sql.placeholder` where values go
 */
export function prepared<Statement>(prepare: (db: Database) => Statement): (db: Database) => Statement {
  const statements = new WeakMap<Database, Statement>();
  return (db) => {
    const known = statements.get(db);
    if (known !== undefined) return known;
    const statement = prepare(db);
    statements.set(db, statement);
    return statement;
  };
}
