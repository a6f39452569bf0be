import { eq } from 'drizzle-orm';
import type { Express } from 'express';
import request from 'supertest';
import { createApp } from '../../server/app';
import { people } from '../../server/db/schema';
import { buildPerson, buildTeam, TEST_PASSWORD } from '../builders/team-builder';
import { signIn, signInAs, TEST_PASSWORD_HASH, visit } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

const passwordHash = TEST_PASSWORD_HASH;
let context: TestContext;
let app: Express;

beforeEach(() => {
  context = createTestContext();
  app = createApp(context);
});
afterEach(() => context.close());

describe('signing in', () => {
  it('opens a session that knows the person and the teams', async () => {
    const team = buildTeam(context, { key: 'drives', name: 'Drives' });
    const { visitor, actor } = await signInAs(context, app, { teamId: team.id, role: 'engineer', name: 'Ada Vane' });
    const { body } = await visitor.get('/api/session').expect(200);
    expect(body.person).toEqual({ id: actor.personId, name: 'Ada Vane', email: actor.email, isAdministrator: false });
    expect(body.teams).toEqual([
      { key: 'drives', name: 'Drives', role: 'engineer', timeZone: 'Europe/Lisbon', targetMarginDb: 6 },
    ]);
    expect(body).toMatchObject({ demo: false, mailbox: true, demoSignIns: [] });
  });

  it('takes the e-mail in any case', async () => {
    buildPerson(context, { email: 'mara@strandline.example', passwordHash });
    const visitor = await signIn(app, ' Mara@Strandline.Example ');
    expect((await visitor.get('/api/session')).body.person.email).toBe('mara@strandline.example');
  });

  it('answers a wrong password, an unknown e-mail and a disabled person alike', async () => {
    const { person } = buildPerson(context, { passwordHash });
    const { person: gone } = buildPerson(context, { passwordHash });
    context.db.update(people).set({ disabledAt: context.now() }).where(eq(people.id, gone.id)).run();
    const visitor = await visit(app);
    const answers = [];
    for (const [email, password] of [
      [person.email, 'not the password'],
      ['nobody@strandline.example', TEST_PASSWORD],
      [gone.email, TEST_PASSWORD],
    ]) {
      const { body, type } = await visitor.post('/api/session').send({ email, password }).expect(401);
      expect(type).toBe('application/problem+json');
      answers.push(body);
    }
    expect(new Set(answers.map((answer) => JSON.stringify(answer))).size).toBe(1);
    expect((await visitor.get('/api/session')).body.person).toBeNull();
  });

  it('keeps an earlier session when a second sign-in fails', async () => {
    const { visitor, actor } = await signInAs(context, app);
    await visitor.post('/api/session').send({ email: actor.email, password: 'not the password' }).expect(401);
    expect((await visitor.get('/api/session')).body.person.id).toBe(actor.personId);
  });

  it('gives a new session id, so that one planted before is worth nothing', async () => {
    const { person } = buildPerson(context, { passwordHash });
    const visitor = await visit(app);
    const before = visitor.cookie('strandline');
    await visitor.post('/api/session').send({ email: person.email, password: TEST_PASSWORD }).expect(204);
    expect(before).toBeDefined();
    expect(visitor.cookie('strandline')).not.toBe(before);
  });

  it('refuses the eleventh wrong password of a quarter of an hour, from this address to this e-mail only', async () => {
    const { person } = buildPerson(context, { passwordHash });
    const { person: other } = buildPerson(context, { passwordHash });
    const visitor = await visit(app);
    const guess = { email: person.email, password: 'not the password' };
    for (let attempt = 0; attempt < 10; attempt += 1) await visitor.post('/api/session').send(guess).expect(401);
    const refused = await visitor
      .post('/api/session')
      .send({ ...guess, password: TEST_PASSWORD })
      .expect(429);
    expect(refused.type).toBe('application/problem+json');
    expect(refused.body).toMatchObject({ type: '/problems/throttled', status: 429 });
    await signIn(app, other.email);
    context.clock.advance(15 * 60_000);
    await signIn(app, person.email);
  });

  it('does not count sign-ins that succeed', async () => {
    const { person } = buildPerson(context, { passwordHash });
    for (let attempt = 0; attempt < 12; attempt += 1) await signIn(app, person.email);
  });
});

describe('cross-site protection', () => {
  it('refuses a change without the token, with a stale one, and takes it with the present one', async () => {
    const { person } = buildPerson(context, { passwordHash });
    const signInBody = { email: person.email, password: TEST_PASSWORD };
    await request(app).post('/api/session').send(signInBody).expect(403);
    const visitor = await visit(app);
    const stale = visitor.cookie('XSRF-TOKEN') ?? '';
    await visitor.post('/api/session').send(signInBody).expect(204);
    expect(visitor.cookie('XSRF-TOKEN')).not.toBe(stale);
    await visitor.delete('/api/session').set('x-xsrf-token', stale).expect(403);
    await visitor.delete('/api/session').expect(204);
  });
});

describe('signing out', () => {
  it('ends this session only', async () => {
    const { visitor, actor } = await signInAs(context, app);
    const other = await signIn(app, actor.email);
    await visitor.delete('/api/session').expect(204);
    expect((await visitor.get('/api/session')).body.person).toBeNull();
    expect((await other.get('/api/session')).body.person.id).toBe(actor.personId);
    await visitor.post('/api/session').send({ email: actor.email, password: TEST_PASSWORD }).expect(204);
  });

  it('everywhere ends every session of the person and nobody else', async () => {
    const { visitor, actor } = await signInAs(context, app);
    const other = await signIn(app, actor.email);
    const { visitor: stranger } = await signInAs(context, app);
    await visitor.delete('/api/session/everywhere').expect(204);
    expect((await visitor.get('/api/session')).body.person).toBeNull();
    expect((await other.get('/api/session')).body.person).toBeNull();
    expect((await stranger.get('/api/session')).body.person).not.toBeNull();
  });

  it('everywhere needs somebody signed in', async () => {
    await (await visit(app)).delete('/api/session/everywhere').expect(401);
  });

  it('happens by itself a week after the last request', async () => {
    const { visitor } = await signInAs(context, app);
    context.clock.advance(6 * 24 * 3600_000);
    expect((await visitor.get('/api/session')).body.person).not.toBeNull();
    context.clock.advance(8 * 24 * 3600_000);
    expect((await visitor.get('/api/session')).body.person).toBeNull();
  });
});
