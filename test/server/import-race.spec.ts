import { fork } from 'node:child_process';
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readConfig } from '../../server/config/read-config';
import { type Context, createContext } from '../../server/context';
import { migrate } from '../../server/db/migrate';
import { builds, frequencyGrids, operatingStates, sweeps, sweepTraces, units } from '../../server/db/schema';
import { buildBench, buildProduct, buildTeam } from '../builders/team-builder';

const FILES = 30;

let context: Context;
let dataDir: string;

beforeEach(() => {
  dataDir = mkdtempSync(join(tmpdir(), 'strandline-race-'));
  context = createContext(readConfig({ NODE_ENV: 'test', LOG_LEVEL: 'silent', STRANDLINE_DATA_DIR: dataDir }), 'race');
  migrate(context.db);
});
afterEach(() => {
  context.close();
  rmSync(dataDir, { recursive: true, force: true });
});

interface Importer {
  begin(): void;
  /** How many sweeps it was the first to store. */
  stored: Promise<number>;
}

function startImporter(...words: string[]): Promise<Importer> {
  const child = fork('test/support/import-same-files.ts', words, {
    execArgv: ['--import', 'tsx'],
    env: { ...process.env, NODE_ENV: 'test', LOG_LEVEL: 'silent', STRANDLINE_DATA_DIR: dataDir },
  });
  const stored = new Promise<number>((resolve, reject) => {
    child.on('message', (message) => typeof message === 'number' && resolve(message));
    child.once('exit', (code) => reject(new Error(`the process ended with code ${code}`)));
  });
  return new Promise((resolve, reject) => {
    child.once('message', () => resolve({ begin: () => child.send('begin'), stored }));
    stored.catch(reject);
  });
}

describe('two processes that import the same files at once', () => {
  it('store every sweep once, and every revision, state, unit and grid', async () => {
    const team = buildTeam(context);
    const [product, bench] = [buildProduct(context, team.id), buildBench(context, team.id)];
    const words = [product.key, bench.key, String(team.id), String(FILES)];
    const importers = await Promise.all([startImporter(...words), startImporter(...words)]);
    for (const importer of importers) importer.begin();
    const [one = 0, other = 0] = await Promise.all(importers.map(({ stored }) => stored));
    expect(one + other).toBe(FILES);

    const { db } = context;
    expect(await db.$count(sweeps)).toBe(FILES);
    expect(await db.$count(sweepTraces)).toBe(FILES);
    expect(await db.$count(operatingStates)).toBe(3);
    expect(await db.$count(units)).toBe(2);
    expect(await db.$count(frequencyGrids)).toBe(1);
    const rows = db.select().from(builds).orderBy(builds.position).all();
    expect(rows.map(({ position, sweepCount }) => [position, sweepCount])).toEqual(
      Array.from({ length: FILES / 2 }, (_, index) => [index + 1, 2]),
    );
    expect(db.$client.pragma('foreign_key_check')).toEqual([]);
    const files = readdirSync(context.config.originalsDir, { recursive: true, withFileTypes: true });
    expect(files.filter((entry) => entry.isFile()).map(({ name }) => name.endsWith('.br'))).toEqual(
      new Array(FILES).fill(true),
    );
  }, 60_000);
});
