import type { Express } from 'express';
import { createApp } from '../../server/app';
import { buildPerson, buildProduct, buildTeam, buildToken } from '../builders/team-builder';
import { signInAs, visit, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let administrator: Visitor;
let administratorId: number;

beforeEach(async () => {
  context = createTestContext();
  app = createApp(context);
  const { visitor, actor } = await signInAs(context, app, { isAdministrator: true, name: 'Root' });
  administrator = visitor;
  administratorId = actor.personId;
});
afterEach(() => context.close());

describe('the installation', () => {
  it('is closed to everybody but administrators', async () => {
    const team = buildTeam(context, { key: 'drives' });
    const { visitor: lead } = await signInAs(context, app, { teamId: team.id, role: 'lead' });
    const calls: ((visitor: Visitor) => ReturnType<Visitor['get']>)[] = [
      (visitor) => visitor.get('/api/installation/teams'),
      (visitor) => visitor.post('/api/installation/teams').send({ key: 'x', name: 'X', timeZone: 'UTC' }),
      (visitor) => visitor.patch('/api/installation/teams/drives').send({ isArchived: true }),
      (visitor) => visitor.get('/api/installation/people'),
      (visitor) => visitor.patch(`/api/installation/people/${administratorId}`).send({ isAdministrator: false }),
      (visitor) => visitor.put('/api/installation/people/1/memberships/drives').send({ role: 'lead' }),
      (visitor) => visitor.delete('/api/installation/people/1/memberships/drives'),
      (visitor) => visitor.get('/api/installation/audit'),
    ];
    const stranger = await visit(app);
    for (const call of calls) {
      expect((await call(lead)).status).toBe(403);
      expect((await call(stranger)).status).toBe(401);
    }
  });

  it('gets a team, its first lead, and shows how many are in it', async () => {
    const input = { key: 'lamps', name: 'Lamps', timeZone: 'Europe/Lisbon' };
    const { body: created } = await administrator.post('/api/installation/teams').send(input).expect(201);
    expect(created).toMatchObject({ ...input, targetMarginDb: 6, memberCount: 0, productCount: 0, isArchived: false });
    await administrator.post('/api/installation/teams').send(input).expect(409);
    const { visitor, actor } = await signInAs(context, app);
    const membership = `/api/installation/people/${actor.personId}/memberships/lamps`;
    await administrator.put(membership).send({ role: 'lead' }).expect(204);
    await visitor.get('/api/teams/lamps/audit').expect(200);
    await administrator.put(membership).send({ role: 'viewer' }).expect(409);
    await administrator.delete(membership).expect(409);
    const { body: people } = await administrator.get('/api/installation/people').expect(200);
    expect(people).toContainEqual(
      expect.objectContaining({
        id: actor.personId,
        memberships: [{ team: 'lamps', teamName: 'Lamps', role: 'lead' }],
      }),
    );
    expect((await administrator.get('/api/installation/teams')).body[0].memberCount).toBe(1);
  });

  it('lets administrators manage the people of a team they are not in, and not its settings', async () => {
    const team = buildTeam(context, { key: 'drives' });
    const { person } = buildPerson(context, { teamId: team.id });
    await administrator.get('/api/teams/drives/members').expect(200);
    await administrator.patch(`/api/teams/drives/members/${person.id}`).send({ role: 'lead' }).expect(204);
    const invitation = { email: 'x@strandline.example', role: 'viewer' };
    await administrator.post('/api/teams/drives/invitations').send(invitation).expect(201);
    await administrator.patch('/api/teams/drives').send({ name: 'Mine' }).expect(404);
    await administrator.get('/api/teams/drives/audit').expect(404);
  });

  it('archives a team from everybody, its tokens too, and brings it back', async () => {
    const team = buildTeam(context, { key: 'drives' });
    buildProduct(context, team.id);
    const { visitor: lead, actor } = await signInAs(context, app, { teamId: team.id, role: 'lead' });
    const bearer = `Bearer ${buildToken(context, team.id, actor.personId)}`;
    await lead.get('/api/teams/drives').set('authorization', bearer).expect(200);
    const { body } = await administrator.patch('/api/installation/teams/drives').send({ isArchived: true }).expect(200);
    expect(body).toMatchObject({ isArchived: true, productCount: 1 });
    await lead.get('/api/teams/drives').expect(404);
    await lead.get('/api/teams/drives').set('authorization', bearer).expect(401);
    expect((await lead.get('/api/session')).body.teams).toEqual([]);
    await administrator.patch('/api/installation/teams/drives').send({ isArchived: false }).expect(200);
    await lead.get('/api/teams/drives').expect(200);
    await administrator.patch('/api/installation/teams/none').send({ isArchived: true }).expect(404);
  });

  it('signs a disabled person out at once', async () => {
    const { visitor, actor } = await signInAs(context, app);
    await administrator.patch(`/api/installation/people/${actor.personId}`).send({ isDisabled: true }).expect(204);
    expect((await visitor.get('/api/session')).body.person).toBeNull();
    const listed = (await administrator.get('/api/installation/people')).body;
    expect(listed.find(({ id }: { id: number }) => id === actor.personId).isDisabled).toBe(true);
  });

  it('always keeps an administrator who can sign in', async () => {
    const own = `/api/installation/people/${administratorId}`;
    await administrator.patch(own).send({ isAdministrator: false }).expect(409);
    await administrator.patch(own).send({ isDisabled: true }).expect(409);
    const { person } = buildPerson(context);
    await administrator.patch(`/api/installation/people/${person.id}`).send({ isAdministrator: true }).expect(204);
    await administrator.patch(own).send({ isAdministrator: false }).expect(204);
    await administrator.get('/api/installation/people').expect(403);
  });
});
