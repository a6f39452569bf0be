import type { Express } from 'express';
import pino from 'pino';
import request, { type Test } from 'supertest';
import { createApp } from '../../server/app';
import { sessions } from '../../server/db/schema';
import { buildSweepFile, buildTags } from '../builders/sweep-builder';
import { buildBench, buildProduct, buildTeam, buildToken } from '../builders/team-builder';
import { countStored } from '../support/count-stored';
import { signInAs, visit, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

const HOUR_MS = 3600_000;

let context: TestContext;
let app: Express;
let lead: Visitor;
let token: string;
let product: ReturnType<typeof buildProduct>;
let lines: string[];

beforeEach(async () => {
  context = createTestContext();
  lines = [];
  const log = pino({ level: 'info' }, { write: (line: string) => void lines.push(line) });
  app = createApp({ ...context, log });
  const team = buildTeam(context, { key: 'chargers' });
  const signedIn = await signInAs(context, app, { teamId: team.id, role: 'lead' });
  lead = signedIn.visitor;
  token = buildToken(context, team.id, signedIn.actor.personId);
  product = buildProduct(context, team.id, { key: 'psu-240' });
});
afterEach(() => context.close());

/** A form byte for byte, as no client library would send it. */
function sendForm(path: string, form: string | Buffer, type = 'multipart/form-data; boundary=XX'): Test {
  return request(app).post(path).set('authorization', `Bearer ${token}`).set('content-type', type).send(form);
}

function part(head: string, body: string | Buffer = 'x'): Buffer {
  return Buffer.concat([Buffer.from(`--XX\r\nContent-Disposition: form-data; ${head}\r\n\r\n`), Buffer.from(body)]);
}

describe('a request that is not well formed', () => {
  it.each<[string, () => Test, number]>([
    [
      'a charset nobody knows',
      () => lead.patch('/api/teams/chargers').type('application/json; charset=none').send('{}'),
      400,
    ],
    [
      'an encoding nobody knows',
      () => lead.patch('/api/teams/chargers').type('json').set('content-encoding', 'none').send('{}'),
      400,
    ],
    ['half a document', () => lead.patch('/api/teams/chargers').type('json').send('{"name'), 400],
    ['a document that is too large', () => lead.patch('/api/teams/chargers').send({ name: 'x'.repeat(300_000) }), 413],
    ['an address that is no text', () => lead.get('/api/teams/%E0%A4%A'), 400],
    ['a form without its boundary', () => sendForm('/api/v1/sweeps', 'x', 'multipart/form-data'), 400],
    ['a form that breaks off', () => sendForm('/api/v1/sweeps', part('name="file"; filename="a.csv"')), 400],
    [
      'a form with a broken heading',
      () => sendForm('/api/v1/sweeps', '--XX\r\nContent\x01: x\r\n\r\nx\r\n--XX--\r\n'),
      400,
    ],
    [
      'more fields than there are',
      () =>
        sendForm(
          '/api/v1/sweeps',
          Buffer.concat([...Array(9).keys()].map((n) => Buffer.concat([part(`name="${n}"`), Buffer.from('\r\n')]))),
        ),
      400,
    ],
  ])('with %s is the caller’s fault', async (_what, send, status) => {
    const before = countStored(context);
    const answer = await send();
    expect({ status: answer.status, type: answer.type }).toEqual({ status, type: 'application/problem+json' });
    expect(countStored(context)).toEqual(before);
    expect(lines.filter((line) => line.includes('"level":50'))).toEqual([]);
  });

  it('a batch that breaks off keeps nothing', async () => {
    const before = countStored(context);
    await lead
      .post('/api/teams/chargers/imports')
      .type('multipart/form-data; boundary=XX')
      .send(part('name="files"; filename="a.csv"'))
      .expect(400);
    expect(countStored(context)).toEqual(before);
  });
});

describe('a change that changes nothing', () => {
  it.each(['/api/teams/chargers', '/api/v1/products/psu-240'])('of %s is taken and not audited', async (path) => {
    const before = countStored(context);
    await lead.patch(path).send({}).expect(200);
    expect(countStored(context)).toEqual(before);
  });

  it('of an operating state or a build is taken and not audited', async () => {
    const state = await lead.post('/api/v1/products/psu-240/states').send({ name: 'idle' }).expect(201);
    const revisions = { hardware: 'A', firmware: '1', builtAt: '2026-01-01T00:00:00Z' };
    const build = await lead.post('/api/v1/products/psu-240/builds').send(revisions).expect(201);
    const before = countStored(context);
    await lead.patch(`/api/v1/products/psu-240/states/${state.body.id}`).send({}).expect(200);
    await lead.patch(`/api/v1/products/psu-240/builds/${build.body.id}`).send({}).expect(200);
    expect(countStored(context)).toEqual(before);
  });

  it('nor do columns the schema does not name', async () => {
    const sneaked = '{"__proto__":{"isArchived":true},"isArchived":true,"id":99,"key":"other","name":"Chargers"}';
    const { body } = await lead.patch('/api/teams/chargers').type('json').send(sneaked).expect(200);
    expect(body).toMatchObject({ key: 'chargers', name: 'Chargers', isArchived: false });
  });
});

describe('a query', () => {
  it.each([
    '/api/v1/products/psu-240/trend',
    '/api/v1/products/psu-240/margin-map',
    '/api/v1/products/psu-240/drops',
    '/api/v1/sweeps?product=psu-240',
    '/api/v1/overlay?product=psu-240',
    '/api/v1/products/psu-240/verdicts?hardware=A&firmware=1',
    '/api/v1/products/psu-240/gate?hardware=A&firmware=1',
  ])('with a word that %s does not know is refused, not answered as if it were not there', async (path) => {
    await lead
      .post('/api/v1/products/psu-240/builds')
      .send({ hardware: 'A', firmware: '1', builtAt: '2026-01-01T00:00:00Z' });
    const [address, query] = path.split('?');
    await lead.get(`${address}?${query ?? ''}&team=chargers`).expect(200);
    const { body } = await lead.get(`${address}?${query ?? ''}&detectr=AV`).expect(400);
    expect(body.detail).toContain('detectr');
  });

  it('for another limit than the product’s is refused', async () => {
    await lead.get('/api/v1/products/psu-240/trend?limit=CISPR32_B').expect(200);
    const { body } = await lead.get('/api/v1/products/psu-240/margin-map?limit=CISPR32_A').expect(400);
    expect(body.detail).toContain('CISPR32_B');
  });
});

describe('the name of a file', () => {
  it.each([
    ['line breaks', 'a\r\nSet-Cookie: x=1.csv', 'aSet-Cookie: x=1.csv'],
    ['marks that turn the reading around', 'gnp.\u202evsc', 'gnp.vsc'],
    ['a way out of the folder', '../../etc/passwd', 'passwd'],
    ['nothing that can be seen', '\u0001', 'unnamed'],
    ['too many characters', 'x'.repeat(999), 'x'.repeat(255)],
  ])('with %s is kept plain and sent as a download', async (_what, name, plain) => {
    const bench = buildBench(context, product.teamId);
    const form = Buffer.concat([
      part('name="tags"', JSON.stringify(buildTags(product, bench))),
      Buffer.from('\r\n'),
      part(`name="file"; filename*=UTF-8''${encodeURIComponent(name)}`, buildSweepFile()),
      Buffer.from('\r\n--XX--\r\n'),
    ]);
    const { body } = await sendForm('/api/v1/sweeps', form).expect(201);
    expect(body.sweep.fileName).toBe(plain);
    const { headers } = await lead.get(`/api/v1/sweeps/${body.sweep.id}/file`).expect(200);
    expect(headers['content-disposition']).toMatch(/^attachment; /);
    expect(headers['content-type']).toBe('application/octet-stream');
    expect(headers['x-content-type-options']).toBe('nosniff');
  });
});

describe('the log', () => {
  it('holds no secret of a link, token, cookie or password', async () => {
    const secret = 'A'.repeat(43);
    const visitor = await visit(app);
    await visitor.get(`/api/invitations/${secret}`);
    await visitor.post(`/api/invitations/${secret}`).send({});
    await visitor.post(`/api/password-resets/${secret}`).send({ password: 'correct horse battery' });
    await visitor.post('/api/session').send({ email: 'a@b.example', password: 'correct horse battery' });
    await request(app).post(`/api/digest/unsubscribe/${secret}`);
    await request(app).get('/api/v1/products').set('authorization', `Bearer ${token}`);
    const log = lines.join('');
    expect(log).toContain('/api/invitations/[secret]');
    for (const word of [secret, token, 'correct horse', 'strandline=', visitor.cookie('XSRF-TOKEN') ?? 'none']) {
      expect(log.includes(word)).toBe(false);
    }
  });
});

describe('an answer', () => {
  it('is kept by nobody in between', async () => {
    for (const path of ['/api/v1/products', '/api/teams/chargers', '/api/health']) {
      expect((await lead.get(path).expect(200)).headers['cache-control']).toBe('private, no-cache');
    }
  });
});

describe('a session', () => {
  const expiries = () =>
    context.db
      .select()
      .from(sessions)
      .all()
      .map(({ expiresAt }) => expiresAt - context.now());

  it('of somebody signed in lives on with use, without a write for every page', async () => {
    const writes = () => context.db.$client.prepare('select total_changes()').pluck().get();
    expect(expiries()).toEqual([7 * 24 * HOUR_MS]);
    context.clock.advance(HOUR_MS);
    const before = writes();
    await lead.get('/api/v1/products').expect(200);
    expect(writes()).toBe(before);
    context.clock.advance(HOUR_MS);
    await lead.get('/api/v1/products').expect(200);
    expect(expiries()).toEqual([7 * 24 * HOUR_MS]);
  });

  it('of a visitor lasts a day', async () => {
    await visit(app);
    expect(expiries()).toContain(24 * HOUR_MS);
  });
});
