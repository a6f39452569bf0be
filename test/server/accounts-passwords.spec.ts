import type { Express } from 'express';
import { createApp } from '../../server/app';
import { auditEntries, outboxMails } from '../../server/db/schema';
import { buildPerson, TEST_PASSWORD } from '../builders/team-builder';
import { sendWaitingMail, withLocalMailbox } from '../support/local-mailbox';
import { secretMailedTo } from '../support/mail-links';
import { signIn, signInAs, TEST_PASSWORD_HASH, visit, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

const passwordHash = TEST_PASSWORD_HASH;
const NEW_PASSWORD = 'a different sentence';
let context: TestContext;
let app: Express;

beforeEach(() => {
  context = createTestContext();
  app = createApp(context);
});
afterEach(() => context.close());

const isSignedIn = async (visitor: Visitor) => (await visitor.get('/api/session')).body.person !== null;

describe('changing the password', () => {
  it('needs the current one, keeps this browser signed in and ends every other session', async () => {
    const { visitor, actor } = await signInAs(context, app);
    const other = await signIn(app, actor.email);
    const refused = await visitor
      .post('/api/account/password')
      .send({ current: 'not the password', next: NEW_PASSWORD })
      .expect(400);
    expect(refused.body.errors).toEqual([{ path: 'current', message: 'is not your current password' }]);
    expect(await isSignedIn(other)).toBe(true);
    await visitor.post('/api/account/password').send({ current: TEST_PASSWORD, next: NEW_PASSWORD }).expect(204);
    expect(await isSignedIn(visitor)).toBe(true);
    expect(await isSignedIn(other)).toBe(false);
    await signIn(app, actor.email, NEW_PASSWORD);
    await (await visit(app)).post('/api/session').send({ email: actor.email, password: TEST_PASSWORD }).expect(401);
  });

  it('refuses a short one', async () => {
    const { visitor } = await signInAs(context, app);
    const { body } = await visitor
      .post('/api/account/password')
      .send({ current: TEST_PASSWORD, next: 'short' })
      .expect(400);
    expect(body.detail).toContain('next: use at least 12 characters');
  });

  it('cannot be used to guess without end', async () => {
    const { visitor } = await signInAs(context, app);
    const guess = { current: 'not the password', next: NEW_PASSWORD };
    for (let attempt = 0; attempt < 20; attempt += 1) {
      await visitor.post('/api/account/password').send(guess).expect(400);
    }
    await visitor.post('/api/account/password').send(guess).expect(429);
  });
});

describe('a forgotten password', () => {
  it('is replaced by a link from the mail, once, and every session ends', async () => {
    const { person } = buildPerson(context, { passwordHash });
    const session = await signIn(app, person.email);
    const visitor = await visit(app);
    await visitor.post('/api/password-resets').send({ email: person.email.toUpperCase() }).expect(202);
    const secret = secretMailedTo(context, person.email);
    await visitor.post(`/api/password-resets/${secret}`).send({ password: NEW_PASSWORD }).expect(204);
    expect(await isSignedIn(session)).toBe(false);
    await visitor.post(`/api/password-resets/${secret}`).send({ password: 'a third sentence' }).expect(404);
    await visitor.post('/api/session').send({ email: person.email, password: NEW_PASSWORD }).expect(204);
  });

  it('answers the same for an e-mail nobody has, and writes nothing', async () => {
    const { person } = buildPerson(context, { passwordHash });
    const visitor = await visit(app);
    const known = await visitor.post('/api/password-resets').send({ email: person.email });
    const unknown = await visitor.post('/api/password-resets').send({ email: 'nobody@strandline.example' });
    expect([unknown.status, unknown.text]).toEqual([known.status, known.text]);
    expect(secretMailedTo(context, 'nobody@strandline.example')).toBeUndefined();
  });

  it('needs an e-mail', async () => {
    const visitor = await visit(app);
    await visitor.post('/api/password-resets').expect(400);
    await visitor.post('/api/password-resets').send({ email: 'nobody' }).expect(400);
  });

  it('has a link that ends after an hour', async () => {
    const { person } = buildPerson(context, { passwordHash });
    const visitor = await visit(app);
    await visitor.post('/api/password-resets').send({ email: person.email }).expect(202);
    context.clock.advance(3600_000);
    const { body } = await visitor
      .post(`/api/password-resets/${secretMailedTo(context, person.email)}`)
      .send({ password: NEW_PASSWORD })
      .expect(404);
    expect(body.detail).toContain('too old');
  });

  it('uses up all links of the person at once', async () => {
    const { person } = buildPerson(context, { passwordHash });
    const visitor = await visit(app);
    await visitor.post('/api/password-resets').send({ email: person.email }).expect(202);
    const first = secretMailedTo(context, person.email);
    await visitor.post('/api/password-resets').send({ email: person.email }).expect(202);
    const second = secretMailedTo(context, person.email);
    await visitor.post(`/api/password-resets/${second}`).send({ password: NEW_PASSWORD }).expect(204);
    await visitor.post(`/api/password-resets/${first}`).send({ password: 'a third sentence' }).expect(404);
  });

  it('can be asked for five times an hour', async () => {
    const { person } = buildPerson(context, { passwordHash });
    const visitor = await visit(app);
    for (let attempt = 0; attempt < 5; attempt += 1) {
      await visitor.post('/api/password-resets').send({ email: person.email }).expect(202);
    }
    await visitor.post('/api/password-resets').send({ email: person.email }).expect(429);
    context.clock.advance(3600_000);
    await visitor.post('/api/password-resets').send({ email: person.email }).expect(202);
  });

  it('leaves no secret in the outbox once the mail is sent, nor ever in the log', async () => {
    const local = await withLocalMailbox(context);
    const { person } = buildPerson(context, { passwordHash });
    const visitor = await visit(app);
    await visitor.post('/api/password-resets').send({ email: person.email }).expect(202);
    const secret = secretMailedTo(context, person.email) ?? '';
    await sendWaitingMail(local.context);
    await local.mailbox.close();
    expect(context.db.select().from(outboxMails).get()).toMatchObject({ status: 'sent', text: '', html: '' });
    await visitor.post(`/api/password-resets/${secret}`).send({ password: NEW_PASSWORD }).expect(204);
    const log = JSON.stringify(context.db.select().from(auditEntries).all());
    expect(log).toContain('person.passwordReset');
    expect(log).not.toContain(secret);
    expect(log).not.toContain(NEW_PASSWORD);
  });
});
