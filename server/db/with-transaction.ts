import type { Database } from './open-database';

/**
 * Runs `work` as one transaction: all of it is stored or nothing. Inside another transaction it joins that one.
 * Synchronous by nature of better-sqlite3; `work` must not return a promise.
 */
export function withTransaction<Result>(database: Database, work: () => Result): Result {
  const client = database.$client;
  if (client.inTransaction) return work();
  return client.transaction(work).immediate();
}
