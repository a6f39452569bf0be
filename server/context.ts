import type { Config } from './config/read-config';
import { type Database, openDatabase } from './db/open-database';
import { createLog, type Logger } from './log';
import { OriginalFiles } from './sweeps/original-files';

/** Everything a verb needs from the outside. */
export interface Context {
  readonly config: Config;
  readonly db: Database;
  readonly log: Logger;
  /** UTC milliseconds; tests pass their own clock. */
  readonly now: () => number;
  readonly originals: OriginalFiles;
  close(): void;
}

/** Builds the collaborators of one process; `close` gives them back. */
export function createContext(config: Config, name: string, now: () => number = Date.now): Context {
  const db = openDatabase(config.databaseFile);
  return {
    config,
    db,
    log: createLog(config, name),
    now,
    originals: new OriginalFiles(config.originalsDir),
    close: () => void db.$client.close(),
  };
}
