import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { ProductSummary } from '@shared/contracts/products';
import { createApp } from '../../server/app';
import { readConfig } from '../../server/config/read-config';
import { createContext } from '../../server/context';
import { migrate } from '../../server/db/migrate';
import { benches, products, teams } from '../../server/db/schema';
import { seedDemoIfEmpty } from '../../server/demo/seed-demo';
import { listen } from '../../server/listen';
import { buildSweep } from '../builders/sweep-builder';
import { buildPerson, buildProduct, buildToken } from '../builders/team-builder';

const ROUNDS = 200;
const MANY_BUILDS = 500;
const DAY_MS = 24 * 3600_000;

/**
 * Server time of what the pages ask for, over HTTP on this machine, one request at a time: the demo's products and a
 * product of 500 builds. Every round asks for each once, so that ratios to the empty answer stand under equal conditions.
 */
const folder = mkdtempSync(join(tmpdir(), 'strandline-pages-'));
const context = createContext(
  readConfig({ NODE_ENV: 'test', LOG_LEVEL: 'silent', STRANDLINE_DATA_DIR: folder, STRANDLINE_DEMO: 'on' }),
  'bench',
);
migrate(context.db);
await seedDemoIfEmpty(context);
const [team] = context.db.select().from(teams).all();
const [bench] = context.db.select().from(benches).all();
if (team === undefined || bench === undefined) throw new Error('the demo did not come');
seedManyBuilds();
const token = buildToken(context, team.id, buildPerson(context, { teamId: team.id, role: 'lead' }).person.id);
const { server, url } = await listen(createApp(context), 0, '127.0.0.1');
const headers = { authorization: `Bearer ${token}` };

const demo = ((await (await fetch(`${url}/api/v1/products`, { headers })).json()) as ProductSummary[]).find(
  ({ buildCount, key }) => buildCount > 10 && key !== 'many-builds',
);
const demoKey = demo?.key ?? '';
const demoBuilds = (await (await fetch(`${url}/api/v1/products/${demoKey}/builds`, { headers })).json()) as {
  id: number;
}[];
const newest = demoBuilds.slice(-3).map(({ id }) => id);
const overlay = `/api/v1/overlay?product=${demoKey}&builds=${newest.join(',')}`;

const asked: [name: string, path: string][] = [
  ['empty answer', '/api/health'],
  ['overview', '/api/v1/products'],
  ['demo margin map', `/api/v1/products/${demoKey}/margin-map`],
  ['demo margin map, one line', `/api/v1/products/${demoKey}/margin-map?line=L`],
  ['demo trend', `/api/v1/products/${demoKey}/trend`],
  ['demo trend, one band', `/api/v1/products/${demoKey}/trend?band=0.5-5%20MHz`],
  ['demo overlay of 3 builds', overlay],
  [`margin map, ${MANY_BUILDS} builds`, '/api/v1/products/many-builds/margin-map'],
  [`trend, ${MANY_BUILDS} builds`, '/api/v1/products/many-builds/trend'],
];
const timesMs = new Map(asked.map(([name]) => [name, [] as number[]]));
let bytes = new Map<string, number>();
for (let round = 0; round < ROUNDS; round++) {
  for (const [name, path] of asked) {
    const startedAt = performance.now();
    const response = await fetch(`${url}${path}`, {
      headers: { ...headers, accept: 'application/octet-stream, application/json' },
    });
    const length = (await response.arrayBuffer()).byteLength;
    timesMs.get(name)?.push(performance.now() - startedAt);
    if (response.status !== 200) throw new Error(`${path} answered ${response.status}`);
    bytes = bytes.set(name, length);
  }
}
const empty = at(timesMs.get('empty answer') ?? [], 0.5);
for (const [name, times] of timesMs) {
  const median = at(times, 0.5);
  const text = `${median.toFixed(2)} ms median, ${at(times, 0.95).toFixed(2)} ms p95, ${(median / empty).toFixed(1)} x empty, ${bytes.get(name)} bytes`;
  console.log(`${name.padEnd(32)} ${text}`);
}
server.close();
server.closeAllConnections();
context.close();
rmSync(folder, { recursive: true, force: true });

function at(times: readonly number[], share: number): number {
  return [...times].sort((a, b) => a - b)[Math.floor(share * (times.length - 1))] ?? NaN;
}

function seedManyBuilds(): void {
  if (team === undefined || bench === undefined) return;
  const product = buildProduct(context, team.id, { key: 'many-builds' });
  const start = context.now() - MANY_BUILDS * DAY_MS;
  for (let index = 0; index < MANY_BUILDS; index++) {
    const takenAt = new Date(start + index * DAY_MS).toISOString();
    for (const line of ['L', 'N'] as const) {
      for (const detector of ['QP', 'AV'] as const) {
        buildSweep(context, product, bench, { firmware: `1.${index}`, line, detector, takenAt });
      }
    }
  }
  console.log(`${context.db.select().from(products).all().length} products seeded`);
}
