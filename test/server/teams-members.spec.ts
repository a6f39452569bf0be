import { type Role, ROLES } from '@shared/access/roles';
import type { Express } from 'express';
import request from 'supertest';
import { createApp } from '../../server/app';
import { buildPerson, buildTeam, buildToken } from '../builders/team-builder';
import { signInAs, visit, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let teamId: number;

beforeEach(() => {
  context = createTestContext();
  app = createApp(context);
  teamId = buildTeam(context, { key: 'drives', name: 'Drives' }).id;
});
afterEach(() => context.close());

type Call = [what: string, run: (visitor: Visitor, personId: number) => ReturnType<Visitor['get']>];

const MANAGING: Call[] = [
  ['changing the settings', (visitor) => visitor.patch('/api/teams/drives').send({ targetMarginDb: 5 })],
  ['inviting', (v) => v.post('/api/teams/drives/invitations').send({ email: 'x@strandline.example', role: 'viewer' })],
  ['sending an invitation again', (visitor) => visitor.post('/api/teams/drives/invitations/1/resend')],
  ['revoking an invitation', (visitor) => visitor.delete('/api/teams/drives/invitations/1')],
  ['changing a role', (visitor, id) => visitor.patch(`/api/teams/drives/members/${id}`).send({ role: 'engineer' })],
  ['removing a member', (visitor, id) => visitor.delete(`/api/teams/drives/members/${id}`)],
  ['listing tokens', (visitor) => visitor.get('/api/teams/drives/tokens')],
  ['making a token', (v) => v.post('/api/teams/drives/tokens').send({ name: 'ci', scopes: ['gate:read'] })],
  ['revoking a token', (visitor) => visitor.delete('/api/teams/drives/tokens/1')],
  ['reading the log', (visitor) => visitor.get('/api/teams/drives/audit')],
];

/** Every managing call with the status it is answered with. */
async function tryAll(visitor: Visitor, personId: number): Promise<[string, number][]> {
  const answers: [string, number][] = [];
  for (const [what, run] of MANAGING) answers.push([what, (await run(visitor, personId)).status]);
  return answers;
}

const all = (status: number) => MANAGING.map(([what]) => [what, status]);

describe('managing a team', () => {
  it.each(ROLES.filter((role) => role !== 'lead'))('is refused to a %s', async (role) => {
    const { visitor } = await signInAs(context, app, { teamId, role });
    const { person } = buildPerson(context, { teamId });
    expect(await tryAll(visitor, person.id)).toEqual(all(403));
  });

  it('is answered to the lead of another team as if the team did not exist', async () => {
    const other = buildTeam(context);
    const { visitor } = await signInAs(context, app, { teamId: other.id, role: 'lead' });
    const { person } = buildPerson(context, { teamId });
    expect(await tryAll(visitor, person.id)).toEqual(all(404));
  });

  it('needs a sign-in', async () => {
    expect(await tryAll(await visit(app), 1)).toEqual(all(401));
  });

  it('is closed to team tokens of whatever scope', async () => {
    const { person } = buildPerson(context, { teamId, role: 'lead' });
    const bearer = `Bearer ${buildToken(context, teamId, person.id)}`;
    const answers = [];
    for (const [what, run] of MANAGING) {
      answers.push([what, (await run(await visit(app), 1).set('authorization', bearer)).status]);
    }
    expect(answers).toEqual(all(403));
  });
});

describe('members', () => {
  it('are listed for everybody in the team, invitations for leads alone', async () => {
    const { visitor: lead, actor } = await signInAs(context, app, { teamId, role: 'lead', name: 'Ada' });
    const { visitor: viewer } = await signInAs(context, app, { teamId, role: 'viewer', name: 'Bo' });
    await lead.post('/api/teams/drives/invitations').send({ email: 'x@strandline.example', role: 'viewer' });
    const seen = (await lead.get('/api/teams/drives/members').expect(200)).body;
    expect(seen.members.map(({ name, role }: { name: string; role: Role }) => [name, role])).toEqual([
      ['Ada', 'lead'],
      ['Bo', 'viewer'],
    ]);
    expect(seen.invitations).toEqual([
      expect.objectContaining({ email: 'x@strandline.example', role: 'viewer', invitedBy: actor.name }),
    ]);
    expect((await viewer.get('/api/teams/drives/members').expect(200)).body.invitations).toEqual([]);
  });

  it('act with a changed role from the next request on', async () => {
    const { visitor: lead } = await signInAs(context, app, { teamId, role: 'lead' });
    const { visitor, actor } = await signInAs(context, app, { teamId, role: 'viewer' });
    await visitor.get('/api/teams/drives/audit').expect(403);
    await lead.patch(`/api/teams/drives/members/${actor.personId}`).send({ role: 'lead' }).expect(204);
    await visitor.get('/api/teams/drives/audit').expect(200);
    await lead.delete(`/api/teams/drives/members/${actor.personId}`).expect(204);
    await visitor.get('/api/teams/drives').expect(404);
  });

  it('always keep a lead', async () => {
    const { visitor: lead, actor } = await signInAs(context, app, { teamId, role: 'lead' });
    const own = `/api/teams/drives/members/${actor.personId}`;
    expect((await lead.patch(own).send({ role: 'engineer' }).expect(409)).body.detail).toContain('last lead');
    await lead.delete(own).expect(409);
    expect((await lead.get('/api/teams/drives/members')).body.members).toHaveLength(1);
    const { person: disabled } = buildPerson(context, { teamId, role: 'lead', disabledAt: null });
    const { visitor: administrator } = await signInAs(context, app, { isAdministrator: true });
    await administrator.patch(`/api/installation/people/${disabled.id}`).send({ isDisabled: true }).expect(204);
    await lead.delete(own).expect(409);
    buildPerson(context, { teamId, role: 'lead' });
    await lead.delete(own).expect(204);
  });

  it('must be in the team to be given another role', async () => {
    const { visitor: lead } = await signInAs(context, app, { teamId, role: 'lead' });
    const { person: stranger } = buildPerson(context);
    await lead.patch(`/api/teams/drives/members/${stranger.id}`).send({ role: 'viewer' }).expect(404);
    await lead.patch(`/api/teams/drives/members/${stranger.id}`).send({ role: 'king' }).expect(400);
    await lead.delete(`/api/teams/drives/members/${stranger.id}`).expect(404);
  });
});

describe('team settings', () => {
  it('change one by one and are checked', async () => {
    const { visitor: lead } = await signInAs(context, app, { teamId, role: 'lead' });
    const bands = [{ name: 'PFC', fromHz: 150e3, toHz: 300e3 }];
    const { body } = await lead.patch('/api/teams/drives').send({ thresholdDb: 3, bands }).expect(200);
    expect(body).toMatchObject({ key: 'drives', name: 'Drives', targetMarginDb: 6, thresholdDb: 3, bands });
    const wrong = [{ name: 'PFC', fromHz: 300e3, toHz: 150e3 }];
    await lead.patch('/api/teams/drives').send({ bands: wrong }).expect(400);
    await lead.patch('/api/teams/drives').send({ timeZone: 'Atlantis/Harbour' }).expect(400);
  });

  it('are read by a token with the scope and by nobody else outside', async () => {
    const { person } = buildPerson(context, { teamId, role: 'lead' });
    const reader = buildToken(context, teamId, person.id, ['results:read']);
    const writer = buildToken(context, teamId, person.id, ['sweeps:write']);
    await request(app).get('/api/teams/drives').set('authorization', `Bearer ${reader}`).expect(200);
    await request(app).get('/api/teams/drives').set('authorization', `Bearer ${writer}`).expect(403);
    await request(app).get('/api/teams/drives').expect(401);
  });
});
