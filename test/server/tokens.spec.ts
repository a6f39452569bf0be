import type { Express } from 'express';
import request from 'supertest';
import { createApp } from '../../server/app';
import { teamTokens } from '../../server/db/schema';
import { buildTeam, TEST_PASSWORD } from '../builders/team-builder';
import { signInAs, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let lead: Visitor;

beforeEach(async () => {
  context = createTestContext();
  app = createApp(context);
  const team = buildTeam(context, { key: 'drives' });
  ({ visitor: lead } = await signInAs(context, app, { teamId: team.id, role: 'lead', name: 'Ada Vane' }));
});
afterEach(() => context.close());

const readTeam = (token: string, key = 'drives') =>
  request(app).get(`/api/teams/${key}`).set('authorization', `Bearer ${token}`);

async function make(scopes: string[], name = 'ci'): Promise<{ id: number; token: string }> {
  return (await lead.post('/api/teams/drives/tokens').send({ name, scopes }).expect(201)).body;
}

describe('a team token', () => {
  it('is shown once and kept as a hash only', async () => {
    const { id, token } = await make(['results:read']);
    expect(token).toMatch(new RegExp(`^strand_${id}_[A-Za-z0-9_-]{43}$`));
    const { body, text } = await lead.get('/api/teams/drives/tokens').expect(200);
    expect(body).toEqual([
      expect.objectContaining({ id, name: 'ci', scopes: ['results:read'], createdBy: 'Ada Vane', revokedAt: null }),
    ]);
    const secret = token.split('_').slice(2).join('_');
    expect(text).not.toContain(secret);
    expect(JSON.stringify(context.db.select().from(teamTokens).all())).not.toContain(secret);
    expect(JSON.stringify((await lead.get('/api/teams/drives/audit')).body)).not.toContain(secret);
  });

  it('does what its scopes allow in its own team', async () => {
    buildTeam(context, { key: 'lamps' });
    const { token } = await make(['results:read']);
    await readTeam(token).expect(200);
    await readTeam(token, 'lamps').expect(404);
    const { token: writer } = await make(['sweeps:write']);
    expect((await readTeam(writer).expect(403)).body.detail).toContain('scope');
  });

  it('needs no cross-site token and opens no session', async () => {
    const { token } = await make(['results:read']);
    const answer = await request(app).patch('/api/teams/drives').set('authorization', `Bearer ${token}`).send({});
    expect(answer.status).toBe(403);
    expect(answer.body.detail).toContain('scope');
    expect(answer.headers['set-cookie']).toBeUndefined();
  });

  it('counts instead of the session beside it, which it neither reads, renews nor ends', async () => {
    const { token } = await make(['results:read']);
    const bearer = `Bearer ${token}`;
    const answer = await lead
      .patch('/api/teams/drives')
      .set('authorization', bearer)
      .send({ name: 'Mine' })
      .expect(403);
    expect(answer.headers['set-cookie']).toBeUndefined();
    await lead.delete('/api/session').set('authorization', bearer).expect(204);
    const { actor, visitor } = await signInAs(context, app);
    const credentials = { email: actor.email, password: TEST_PASSWORD };
    await visitor.post('/api/session').set('authorization', bearer).send(credentials).expect(400);
    expect((await lead.get('/api/session').expect(200)).body.person.name).toBe('Ada Vane');
  });

  it('ends when revoked, and stays on the list with the time', async () => {
    const { id, token } = await make(['results:read']);
    await lead.delete(`/api/teams/drives/tokens/${id}`).expect(204);
    await lead.delete(`/api/teams/drives/tokens/${id}`).expect(204);
    await readTeam(token).expect(401);
    const { body } = await lead.get('/api/teams/drives/tokens');
    expect(body[0].revokedAt).toBe(new Date(context.now()).toISOString());
  });

  it('shows when it was last used', async () => {
    const { token } = await make(['results:read']);
    context.clock.advance(3600_000);
    await readTeam(token).expect(200);
    const { body } = await lead.get('/api/teams/drives/tokens');
    expect(body[0].lastUsedAt).toBe(new Date(context.now()).toISOString());
  });

  it.each([
    ['unknown', 'strand_999_0123456789012345678901234567890123456789012'],
    ['of another secret', 'strand_1_0123456789012345678901234567890123456789012'],
    ['malformed', 'let-me-in'],
  ])('that is %s is refused', async (_what, token) => {
    await make(['results:read']);
    await readTeam(token).expect(401);
  });

  it('needs a scope there is', async () => {
    await lead.post('/api/teams/drives/tokens').send({ name: 'ci', scopes: [] }).expect(400);
    await lead
      .post('/api/teams/drives/tokens')
      .send({ name: 'ci', scopes: ['everything'] })
      .expect(400);
  });

  it('of another team cannot be revoked', async () => {
    const { id } = await make(['results:read']);
    const other = buildTeam(context, { key: 'lamps' });
    const { visitor: stranger } = await signInAs(context, app, { teamId: other.id, role: 'lead' });
    await stranger.delete(`/api/teams/lamps/tokens/${id}`).expect(404);
  });
});
