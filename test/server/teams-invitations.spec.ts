import type { Express } from 'express';
import { createApp } from '../../server/app';
import { outboxMails } from '../../server/db/schema';
import { buildPerson, buildTeam, TEST_PASSWORD } from '../builders/team-builder';
import { secretMailedTo } from '../support/mail-links';
import { signIn, signInAs, TEST_PASSWORD_HASH, visit, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

const EMAIL = 'newcomer@strandline.example';
const DAY_MS = 24 * 3600_000;
let context: TestContext;
let app: Express;
let lead: Visitor;

beforeEach(async () => {
  context = createTestContext();
  app = createApp(context);
  const team = buildTeam(context, { key: 'drives', name: 'Drives & Co' });
  ({ visitor: lead } = await signInAs(context, app, { teamId: team.id, role: 'lead', name: 'Ada Vane' }));
});
afterEach(() => context.close());

async function invite(email = EMAIL): Promise<{ id: number; secret: string }> {
  const { body } = await lead.post('/api/teams/drives/invitations').send({ email, role: 'technician' }).expect(201);
  return { id: body.id, secret: secretMailedTo(context, email) ?? '' };
}

describe('an invitation', () => {
  it('lets somebody new in with a name and a password, signed in at once', async () => {
    const { secret } = await invite();
    const visitor = await visit(app);
    const { body: view } = await visitor.get(`/api/invitations/${secret}`).expect(200);
    expect(view).toEqual({ email: EMAIL, teamName: 'Drives & Co', role: 'technician', isKnown: false });
    await visitor.post(`/api/invitations/${secret}`).send({ name: 'Ivo Sand', password: TEST_PASSWORD }).expect(204);
    const { body: session } = await visitor.get('/api/session');
    expect(session.person.email).toBe(EMAIL);
    expect(session.teams).toEqual([expect.objectContaining({ key: 'drives', role: 'technician' })]);
    await signIn(app, EMAIL);
    await visitor.post(`/api/invitations/${secret}`).send({ name: 'Ivo', password: TEST_PASSWORD }).expect(404);
    expect((await lead.get('/api/teams/drives/members')).body.invitations).toEqual([]);
  });

  it('asks somebody new for both, naming what is missing', async () => {
    const { secret } = await invite();
    const { body } = await (await visit(app)).post(`/api/invitations/${secret}`).send({ name: 'Ivo' }).expect(400);
    expect(body.errors).toEqual([{ path: 'password', message: 'is needed for a new account' }]);
  });

  it('adds a known person to the team without signing the browser in as them', async () => {
    const { person } = buildPerson(context, { passwordHash: TEST_PASSWORD_HASH });
    const { secret } = await invite(person.email);
    const visitor = await visit(app);
    expect((await visitor.get(`/api/invitations/${secret}`)).body.isKnown).toBe(true);
    await visitor.post(`/api/invitations/${secret}`).send({}).expect(204);
    expect((await visitor.get('/api/session')).body.person).toBeNull();
    const session = await (await signIn(app, person.email)).get('/api/session');
    expect(session.body.teams).toHaveLength(1);
  });

  it('ends after seven days', async () => {
    const { secret } = await invite();
    const visitor = await visit(app);
    context.clock.advance(7 * DAY_MS - 1);
    await visitor.get(`/api/invitations/${secret}`).expect(200);
    context.clock.advance(1);
    await visitor.get(`/api/invitations/${secret}`).expect(404);
    const late = { name: 'Ivo Sand', password: TEST_PASSWORD };
    await (await visit(app)).post(`/api/invitations/${secret}`).send(late).expect(404);
  });

  it('sent again has a new link for seven days, and the old one ends', async () => {
    const { id, secret } = await invite();
    context.clock.advance(6 * DAY_MS);
    await lead.post(`/api/teams/drives/invitations/${id}/resend`).expect(204);
    const visitor = await visit(app);
    await visitor.get(`/api/invitations/${secret}`).expect(404);
    context.clock.advance(6 * DAY_MS);
    await visitor.get(`/api/invitations/${secretMailedTo(context, EMAIL)}`).expect(200);
  });

  it('taken back opens nothing', async () => {
    const { id, secret } = await invite();
    await lead.delete(`/api/teams/drives/invitations/${id}`).expect(204);
    await lead.delete(`/api/teams/drives/invitations/${id}`).expect(404);
    await (await visit(app)).get(`/api/invitations/${secret}`).expect(404);
  });

  it('goes once to one person, and never to a member', async () => {
    await invite();
    const again = await lead.post('/api/teams/drives/invitations').send({ email: EMAIL, role: 'lead' }).expect(409);
    expect(again.body.detail).toContain(EMAIL);
    const { body } = await lead.get('/api/session');
    const self = { email: body.person.email, role: 'viewer' };
    await lead.post('/api/teams/drives/invitations').send(self).expect(409);
  });

  it('of another team can neither be revoked nor sent again', async () => {
    const { id } = await invite();
    const other = buildTeam(context, { key: 'lamps' });
    const { visitor: stranger } = await signInAs(context, app, { teamId: other.id, role: 'lead' });
    await stranger.delete(`/api/teams/lamps/invitations/${id}`).expect(404);
    await stranger.post(`/api/teams/lamps/invitations/${id}/resend`).expect(404);
    await stranger.delete(`/api/teams/drives/invitations/${id}`).expect(404);
  });

  it('does not revive a disabled account', async () => {
    const { person } = buildPerson(context);
    const { secret } = await invite(person.email);
    const { visitor: administrator } = await signInAs(context, app, { isAdministrator: true });
    await administrator.patch(`/api/installation/people/${person.id}`).send({ isDisabled: true }).expect(204);
    await (await visit(app)).post(`/api/invitations/${secret}`).send({}).expect(403);
  });

  it('escapes the team name in the mail', async () => {
    await invite();
    const mail = context.db.select().from(outboxMails).get();
    expect(mail?.html).toContain('Join Drives &amp; Co');
    expect(mail?.text).toContain('Join Drives & Co');
  });
});
