import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readConfig } from '../../server/config/read-config';
import { type Context, createContext } from '../../server/context';
import { migrate } from '../../server/db/migrate';
import { TestClock } from './test-clock';

export interface TestContext extends Context {
  readonly clock: TestClock;
}

/** A context with the real migrations on a memory database, a temporary folder and a clock of its own. */
export function createTestContext(environment: NodeJS.ProcessEnv = {}, clock = new TestClock()): TestContext {
  const dataDir = mkdtempSync(join(tmpdir(), 'strandline-'));
  const config = readConfig({
    NODE_ENV: 'test',
    LOG_LEVEL: 'silent',
    STRANDLINE_DATA_DIR: dataDir,
    STRANDLINE_DEMO: 'off',
    ...environment,
  });
  const context = createContext({ ...config, databaseFile: ':memory:' }, 'test', clock.now);
  migrate(context.db);
  return {
    ...context,
    clock,
    close: () => {
      context.close();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
}
