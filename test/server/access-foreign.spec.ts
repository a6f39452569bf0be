import { decodeFrames } from '@shared/traces/frames';
import type { Response } from 'supertest';
import { productShares, teams } from '../../server/db/schema';
import { eq } from 'drizzle-orm';
import { type AccessScene, buildAccessScene, MARK, type Method } from '../builders/access-scene';
import { countStored } from '../support/count-stored';
import { createTestContext, type TestContext } from '../support/test-context';

type Ids = AccessScene['own'];

let context: TestContext;
let scene: AccessScene;

beforeAll(async () => {
  context = createTestContext();
  scene = await buildAccessScene(context);
});
afterAll(() => context.close());
beforeEach(() => void context.db.$client.exec('savepoint one_test'));
afterEach(() => void context.db.$client.exec('rollback to one_test; release one_test'));

/** Calls as a lead of the other team. */
async function ask(method: Method, path: string, body: object = {}): Promise<Response> {
  const test = scene.ask('foreign lead', method, path);
  return method === 'get' ? test : test.send(body);
}

/** Addresses of the own team's things, each with a number or key that can be guessed. */
const GUESSED: [Method, string, (ids: Ids) => string, object][] = [
  ['get', 'a team', ({ team }) => `/api/teams/${team}`, {}],
  ['get', 'its members', ({ team }) => `/api/teams/${team}/members`, {}],
  ['patch', 'a bench', ({ team, bench }) => `/api/teams/${team}/benches/${bench}`, {}],
  ['get', 'an import', ({ team, batch }) => `/api/teams/${team}/imports/${batch}`, {}],
  ['get', 'a product', ({ product }) => `/api/v1/products/${product}`, {}],
  ['patch', 'a product', ({ product }) => `/api/v1/products/${product}`, { name: 'mine' }],
  ['get', 'a product by its team', ({ product, team }) => `/api/v1/products/${product}?team=${team}`, {}],
  ['get', 'the products of a team', ({ team }) => `/api/v1/products?team=${team}`, {}],
  ['get', 'the sweeps of a product', ({ product }) => `/api/v1/sweeps?product=${product}`, {}],
  ['get', 'the sweeps of a team', ({ team }) => `/api/v1/sweeps?team=${team}`, {}],
  ['get', 'a sweep', ({ sweep }) => `/api/v1/sweeps/${sweep}`, {}],
  ['get', 'a trace', ({ sweep }) => `/api/v1/sweeps/${sweep}/trace`, {}],
  ['get', 'a file', ({ sweep }) => `/api/v1/sweeps/${sweep}/file`, {}],
  ['delete', 'a sweep', ({ sweep }) => `/api/v1/sweeps/${sweep}`, {}],
  ['get', 'a drop', ({ drop }) => `/api/v1/drops/${drop}`, {}],
  ['post', 'a move of a drop', ({ drop }) => `/api/v1/drops/${drop}/moves`, { state: 'checking' }],
  ['put', 'the owner of a drop', ({ drop }) => `/api/v1/drops/${drop}/owner`, { personId: null }],
  ['post', 'a note on a drop', ({ drop }) => `/api/v1/drops/${drop}/notes`, { text: 'hello' }],
  ['get', 'a run', ({ run }) => `/api/v1/runs/${run}`, {}],
];

/** A thing of nobody: numbers and keys that were never given out. */
function nobodys(ids: Ids): Ids {
  const [team, product, bench] = ['no-team', 'no-product', 'no-bench'];
  return { ...ids, team, product, bench, batch: 99_999, sweep: 99_999, drop: 99_999, run: 99_999 };
}

/** What a refusal says, but for the number or key that was asked for. */
function saying({ body }: Response, path: string): string {
  const words = JSON.stringify(body);
  const given = path.split(/[/?=&]/).filter((part) => /-|^\d+$|^quills$/.test(part));
  return given.reduce((text, part) => text.replaceAll(part, '*'), words);
}

describe('to another team', () => {
  it.each(GUESSED)('%s %s looks as if there were none', async (method, _what, path, body) => {
    const there = await ask(method, path(scene.own), body);
    const none = await ask(method, path(nobodys(scene.own)), body);
    expect([there.status, none.status]).toEqual([404, 404]);
    expect(saying(there, path(scene.own))).toBe(saying(none, path(nobodys(scene.own))));
    expect(there.text).not.toContain(MARK);
  });

  it('lists show nothing', async () => {
    for (const path of ['/api/v1/products', '/api/v1/sweeps', '/api/session']) {
      expect((await ask('get', path).then(({ text }) => text)).includes(MARK)).toBe(false);
    }
  });
});

describe('under a product or team of one’s own', () => {
  it.each<[Method, string, (own: Ids, foreign: Ids) => string, object]>([
    ['get', 'a build', (own, { product }) => `/api/v1/products/${product}/builds/${own.build}`, {}],
    ['patch', 'a build', (own, { product }) => `/api/v1/products/${product}/builds/${own.build}`, { notes: 'x' }],
    [
      'patch',
      'an operating state',
      (own, { product }) => `/api/v1/products/${product}/states/${own.state}`,
      { load: '' },
    ],
    [
      'get',
      'a sweep in an overlay',
      (own, { product }) => `/api/v1/overlay?product=${product}&sweeps=${own.sweep}`,
      {},
    ],
    ['get', 'an import', (own, { team }) => `/api/teams/${team}/imports/${own.batch}`, {}],
    ['delete', 'a token', (own, { team }) => `/api/teams/${team}/tokens/${own.token}`, {}],
    ['delete', 'an invitation', (own, { team }) => `/api/teams/${team}/invitations/${own.invitation}`, {}],
    ['post', 'an invitation again', (own, { team }) => `/api/teams/${team}/invitations/${own.invitation}/resend`, {}],
    ['delete', 'a recipient', (own, { team }) => `/api/teams/${team}/digest/recipients/${own.recipient}`, {}],
    ['patch', 'a member', (own, { team }) => `/api/teams/${team}/members/${own.person}`, { role: 'viewer' }],
    ['delete', 'a member', (own, { team }) => `/api/teams/${team}/members/${own.person}`, {}],
    ['patch', 'a bench', (own, { team }) => `/api/teams/${team}/benches/${own.bench}`, { notes: 'x' }],
  ])('%s %s of another team is not found', async (method, _what, path, body) => {
    const before = countStored(context);
    const answer = await ask(method, path(scene.own, scene.foreign), body);
    expect(answer.status).toBe(404);
    expect(answer.text).not.toContain(MARK);
    expect(countStored(context)).toEqual(before);
  });

  it('builds of another product add no trace to an overlay', async () => {
    const { product, build } = scene.foreign;
    const answer = await scene
      .ask('foreign lead', 'get', `/api/v1/overlay?product=${product}&builds=${build},${scene.own.build}`)
      .responseType('blob');
    const bytes = answer.body as Buffer;
    const { traces } = decodeFrames<{ buildId: number }>(new Uint8Array(bytes).buffer);
    expect([...new Set(traces.map(({ meta }) => meta.buildId))]).toEqual([build]);
  });

  it('the reference cannot be a build of another product', async () => {
    const choice = { buildId: scene.own.build, reason: 'looks good' };
    expect((await ask('put', `/api/v1/products/${scene.foreign.product}/reference`, choice)).status).toBe(404);
  });

  it('a drop cannot be shown fixed by a build of another product', async () => {
    const move = { state: 'fixed', fixedByBuildId: scene.own.laterBuild };
    expect((await ask('post', `/api/v1/drops/${scene.foreign.drop}/moves`, move)).status).toBe(404);
  });

  it('a drop cannot be given to somebody outside the team', async () => {
    const { status, text } = await ask('put', `/api/v1/drops/${scene.foreign.drop}/owner`, {
      personId: scene.own.person,
    });
    expect(status).toBe(400);
    expect(text).not.toContain(MARK);
  });

  it('a sweep cannot name a bench of another team', async () => {
    const { product, file } = scene.foreign;
    const tags = {
      product,
      bench: scene.own.bench,
      hardware: 'C1',
      firmware: '1',
      state: 's',
      line: 'L',
      detector: 'QP',
    };
    const answer = await scene
      .ask('foreign lead', 'post', '/api/v1/sweeps')
      .field('tags', JSON.stringify(tags))
      .attach('file', file, 'sweep.csv');
    expect(answer.status).toBe(404);
    expect(answer.text).not.toContain(MARK);
  });
});

describe('a product shared with a team', () => {
  const shareWithForeign = () => {
    const teamId = context.db.select().from(teams).where(eq(teams.key, 'lamps')).get()?.id ?? 0;
    const sweepsOwner = context.db.$client.prepare('select product_id from sweeps where id = ?');
    const productId = sweepsOwner.pluck().get(scene.own.sweep) as number;
    context.db.insert(productShares).values({ productId, teamId, sharedBy: scene.own.person, createdAt: 0 }).run();
  };

  it('is read and not changed', async () => {
    shareWithForeign();
    const { own } = scene;
    for (const path of [
      `/api/v1/products/${own.product}`,
      `/api/v1/products/${own.product}/trend`,
      `/api/v1/sweeps/${own.sweep}`,
      `/api/v1/drops/${own.drop}`,
    ]) {
      expect({ path, status: (await ask('get', path)).status }).toEqual({ path, status: 200 });
    }
    for (const [method, path, body] of [
      ['patch', `/api/v1/products/${own.product}`, { name: 'mine' }],
      ['put', `/api/v1/products/${own.product}/shares`, { teams: [] }],
      ['put', `/api/v1/products/${own.product}/reference`, { buildId: null, reason: 'because' }],
      ['delete', `/api/v1/sweeps/${own.sweep}`, {}],
      ['post', `/api/v1/drops/${own.drop}/notes`, { text: 'hello' }],
      ['post', `/api/v1/products/${own.product}/evaluate`, {}],
    ] as const) {
      expect({ path, status: (await ask(method, path, body)).status }).toEqual({ path, status: 403 });
    }
  });

  it('keeps the other teams it is shared with, the owner’s audit and runs to its owner', async () => {
    shareWithForeign();
    expect((await ask('get', `/api/v1/products/${scene.own.product}`)).body.sharedWith).toEqual([]);
    expect((await ask('get', `/api/v1/runs/${scene.own.run}`)).status).toBe(404);
    expect((await ask('get', `/api/teams/${scene.own.team}/audit`)).status).toBe(404);
  });

  it('goes with its team when that is archived, by whatever address', async () => {
    shareWithForeign();
    context.db.update(teams).set({ isArchived: true }).where(eq(teams.key, scene.own.team)).run();
    const { product, sweep, drop } = scene.own;
    for (const path of [`products/${product}`, `sweeps/${sweep}`, `sweeps/${sweep}/file`, `drops/${drop}`]) {
      expect({ path, status: (await ask('get', `/api/v1/${path}`)).status }).toEqual({ path, status: 404 });
    }
  });
});
