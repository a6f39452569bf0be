import { eq } from 'drizzle-orm';
import type { Express } from 'express';
import request from 'supertest';
import { createApp } from '../../server/app';
import { auditEntries, builds, drops, dropSightings, productShares, referenceChoices } from '../../server/db/schema';
import { judgeProductNow } from '../../server/judging/judge-stale-builds';
import { buildLaboratory, dayOf, type Laboratory, measureBuild, measureQuietBuilds } from '../builders/bench-day';
import { buildPerson, buildTeam, buildToken } from '../builders/team-builder';
import { signInAs, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let laboratory: Laboratory;
let engineer: Visitor;
let engineerId: number;

beforeEach(async () => {
  context = createTestContext();
  app = createApp(context);
  laboratory = buildLaboratory(context);
  measureQuietBuilds(context, laboratory);
  measureBuild(context, laboratory, 6, { levelsDbuv: [56.1, 55.9] });
  judgeProductNow(context, laboratory.product.id);
  const { visitor, actor } = await signInAs(context, app, {
    teamId: laboratory.team.id,
    role: 'engineer',
    name: 'Ada Vane',
  });
  engineer = visitor;
  engineerId = actor.personId;
});
afterEach(() => context.close());

function buildId(n: number): number {
  return context.db.select().from(builds).where(eq(builds.position, n)).get()?.id ?? 0;
}

async function move(visitor: Visitor, body: object, status = 200) {
  return (await visitor.post('/api/v1/drops/1/moves').send(body).expect(status)).body;
}

describe('the list of drops', () => {
  it('shows a product’s drops and a team’s', async () => {
    const { body } = await engineer.get(`/api/v1/products/${laboratory.product.key}/drops`).expect(200);
    expect(body).toEqual([
      expect.objectContaining({
        id: 1,
        product: laboratory.product.key,
        team: laboratory.team.key,
        hardware: 'C1',
        firmware: '1.6',
        operatingState: '230 V full load',
        band: '0.15-0.5 MHz',
        state: 'new',
        owner: null,
        witnesses: [{ line: 'L', detector: 'QP' }],
        sentence: 'Firmware 1.6 lost 6.0 dB on L at 159 kHz (QP). 9.4 dB left to the limit.',
      }),
    ]);
    expect((await engineer.get(`/api/teams/${laboratory.team.key}/drops`).expect(200)).body).toEqual(body);
  });

  it('narrows by state and owner, and refuses states there are not', async () => {
    const path = `/api/teams/${laboratory.team.key}/drops`;
    const count = async (query: string) => (await engineer.get(`${path}?${query}`).expect(200)).body.length;
    expect(await count('state=open')).toBe(1);
    expect(await count('state=new,checking&owner=nobody')).toBe(1);
    expect(await count('state=fixed')).toBe(0);
    expect(await count('owner=me')).toBe(0);
    await engineer.put('/api/v1/drops/1/owner').send({ personId: engineerId }).expect(200);
    expect(await count('owner=me')).toBe(1);
    expect(await count(`owner=${engineerId}`)).toBe(1);
    expect(await count('owner=nobody')).toBe(0);
    await engineer.get(`${path}?state=closed`).expect(400);
  });

  it('puts what is over the limit first, then the least margin left, then the largest loss; closed ones last', async () => {
    const [first] = context.db.select().from(drops).all();
    if (first === undefined) throw new Error('there is no drop');
    const { id: _id, ...row } = first;
    const variants = [
      { band: 'b', marginDb: 1, differenceDb: -3 },
      { band: 'c', marginDb: -1, isOverLimit: true },
      { band: 'd', marginDb: 1, differenceDb: -5 },
      { band: 'e', marginDb: -2, isOverLimit: true },
      { band: 'f', marginDb: -9, isOverLimit: true, state: 'accepted' as const },
    ];
    for (const variant of variants)
      context.db
        .insert(drops)
        .values({ ...row, ...variant })
        .run();
    const { body } = await engineer.get(`/api/teams/${laboratory.team.key}/drops`).expect(200);
    expect(body.map((one: { band: string }) => one.band)).toEqual(['e', 'c', 'd', 'b', '0.15-0.5 MHz', 'f']);
  });

  it('ranks by what is left in the newest build that shows the loss', async () => {
    const [first] = context.db.select().from(drops).all();
    if (first === undefined) throw new Error('there is no drop');
    const { id: _id, ...row } = first;
    context.db
      .insert(drops)
      .values({ ...row, band: 'b', marginDb: 3 })
      .run();
    measureBuild(context, laboratory, 7, { levelsDbuv: [50] });
    const loss = { differenceDb: -9, marginDb: 1, frequencyHz: 159e3, isOverLimit: false, harmonic: null };
    context.db
      .insert(dropSightings)
      .values({ dropId: 1, buildId: buildId(7), loss })
      .run();
    const path = `/api/teams/${laboratory.team.key}/drops`;
    const ranked = async () => (await engineer.get(path).expect(200)).body.map((one: { id: number }) => one.id);
    expect(await ranked()).toEqual([1, 2]);
    context.db
      .update(dropSightings)
      .set({ loss: { ...loss, marginDb: 8 } })
      .run();
    expect(await ranked()).toEqual([2, 1]);
    context.db
      .update(dropSightings)
      .set({ loss: { ...loss, marginDb: 8, isOverLimit: true } })
      .run();
    expect(await ranked()).toEqual([1, 2]);
  });
});

describe('a drop', () => {
  it('shows its evidence, its history and the moves the caller may make', async () => {
    const { body } = await engineer.get('/api/v1/drops/1').expect(200);
    expect(body.evidence.referenceBuilds).toHaveLength(5);
    expect(body.evidence.witnesses[0].judgement).toMatchObject({ verdict: 'lost', buildRuns: 2, referenceRuns: 5 });
    expect(body.history).toEqual([{ at: expect.any(String), actor: 'judge', kind: 'raised', text: body.sentence }]);
    expect(body.moves).toEqual(['checking', 'causeKnown', 'fixed', 'accepted']);
    expect(body.assignable).toEqual([{ id: engineerId, name: 'Ada Vane' }]);
    expect(body.remarks.map((one: { code: string }) => one.code)).toContain('noBackground');
  });

  it('shows the builds it was seen in, what is left in the newest, and the one whose margin is back', async () => {
    const { team, product } = laboratory;
    context.db
      .insert(referenceChoices)
      .values({ productId: product.id, buildId: buildId(5), chosenBy: engineerId, chosenAt: 1, reason: 'released' })
      .run();
    measureBuild(context, laboratory, 7, { levelsDbuv: [56.5, 56.3] });
    judgeProductNow(context, product.id);
    const seen = { hardware: 'C1', frequencyHz: 159_000, isOverLimit: false };
    const { body: carried } = await engineer.get('/api/v1/drops/1').expect(200);
    expect(carried.seenIn).toEqual([
      { ...seen, buildId: buildId(6), firmware: '1.6', differenceDb: carried.differenceDb, marginDb: carried.marginDb },
      {
        ...seen,
        buildId: buildId(7),
        firmware: '1.7',
        differenceDb: expect.closeTo(-6.7, 5),
        marginDb: expect.any(Number),
      },
    ]);
    expect(carried.latest).toEqual(carried.seenIn[1]);
    expect(carried).toMatchObject({ firmware: '1.6', noLongerSeenIn: null, state: 'new' });
    measureBuild(context, laboratory, 8, { levelsDbuv: [49.8, 49.9, 49.7] });
    judgeProductNow(context, product.id);
    const { body } = await engineer.get(`/api/teams/${team.key}/drops`).expect(200);
    expect(body).toEqual([
      expect.objectContaining({
        latest: carried.latest,
        noLongerSeenIn: { id: buildId(8), hardware: 'C1', firmware: '1.8' },
      }),
    ]);
  });

  it('is taken, checked, noted and closed with every step in its history and the audit log', async () => {
    await engineer.put('/api/v1/drops/1/owner').send({ personId: engineerId }).expect(200);
    await move(engineer, { state: 'checking' });
    await engineer.post('/api/v1/drops/1/notes').send({ text: 'Repeated with the other cable: same.' }).expect(200);
    await move(engineer, { state: 'causeKnown', note: 'dithering is off' });
    const closed = await move(engineer, { state: 'accepted', note: 'ships with the ferrite' });
    expect(closed).toMatchObject({
      state: 'accepted',
      owner: { id: engineerId, name: 'Ada Vane' },
      moves: ['checking'],
    });
    expect(closed.history.map((one: { text: string }) => one.text).slice(1)).toEqual([
      'Given to Ada Vane.',
      'Moved from new to being checked.',
      'Repeated with the other cable: same.',
      'Moved from being checked to cause known: dithering is off',
      'Moved from cause known to accepted: ships with the ferrite',
    ]);
    const audited = context.db.select().from(auditEntries).where(eq(auditEntries.subjectKind, 'drop')).all();
    expect(audited.map(({ action, actorName }) => `${actorName} ${action}`)).toEqual([
      'judge drop.raised',
      'Ada Vane drop.assigned',
      'Ada Vane drop.moved',
      'Ada Vane drop.noted',
      'Ada Vane drop.moved',
      'Ada Vane drop.moved',
    ]);
  });

  it('is accepted or reopened only with a reason', async () => {
    expect((await move(engineer, { state: 'accepted' }, 409)).detail).toBe('note: to accept a drop needs a reason');
    await move(engineer, { state: 'accepted', note: 'ships so' });
    expect((await move(engineer, { state: 'fixed', fixedByBuildId: buildId(5) }, 409)).detail).toBe(
      'a drop that is accepted cannot become fixed',
    );
    await move(engineer, { state: 'checking' }, 409);
    expect((await move(engineer, { state: 'checking', note: 'the customer asks' })).state).toBe('checking');
  });

  it('is never moved to new or withdrawn by hand', async () => {
    await move(engineer, { state: 'withdrawn' }, 400);
    await move(engineer, { state: 'new' }, 400);
    context.db.update(drops).set({ state: 'withdrawn' }).run();
    await move(engineer, { state: 'checking', note: 'but it is there' }, 409);
  });

  it('is owned only by somebody of the team who can measure', async () => {
    const viewer = buildPerson(context, { teamId: laboratory.team.id, role: 'viewer' }).person;
    const stranger = buildPerson(context, { teamId: buildTeam(context).id, role: 'lead' }).person;
    for (const personId of [viewer.id, stranger.id, 4711]) {
      await engineer.put('/api/v1/drops/1/owner').send({ personId }).expect(400);
    }
    await engineer.put('/api/v1/drops/1/owner').send({ personId: engineerId }).expect(200);
    const { body } = await engineer.put('/api/v1/drops/1/owner').send({ personId: null }).expect(200);
    expect(body.owner).toBeNull();
  });
});

describe('fixed', () => {
  const fix = (n: number, status: number) => move(engineer, { state: 'fixed', fixedByBuildId: buildId(n) }, status);

  it('must name a build', async () => {
    expect((await move(engineer, { state: 'fixed' }, 409)).detail).toContain('must name the build that shows it');
    await move(engineer, { state: 'fixed', fixedByBuildId: 4711 }, 404);
  });

  it('is refused for an older build, and for one that is not judged yet', async () => {
    expect((await fix(5, 409)).detail).toBe('build C1 / 1.5 is not newer than C1 / 1.6, which shows the loss');
    expect((await fix(6, 409)).detail).toBe('build C1 / 1.6 is not newer than C1 / 1.6, which shows the loss');
    measureBuild(context, laboratory, 7, { levelsDbuv: [50] });
    expect((await fix(7, 409)).detail).toBe('build C1 / 1.7 has sweeps that are not judged yet: judge it first');
  });

  it('is refused for a build older than one that shows the loss again', async () => {
    measureBuild(context, laboratory, 7, { levelsDbuv: [50, 50.2] });
    measureBuild(context, laboratory, 8, { levelsDbuv: [56, 56.2] });
    judgeProductNow(context, laboratory.product.id);
    expect((await fix(7, 409)).detail).toBe('build C1 / 1.7 is not newer than C1 / 1.8, which shows the loss');
  });

  it('is refused for a build that held the lower margin: it still has the loss', async () => {
    measureBuild(context, laboratory, 7, { levelsDbuv: [56, 56.2] });
    judgeProductNow(context, laboratory.product.id);
    expect((await fix(7, 409)).detail).toBe(
      'build C1 / 1.7 still has the loss in 230 V full load, L QP, 0.15-0.5 MHz: 9.4 dB of margin, 9.5 dB with the loss, 15.5 dB before it',
    );
  });

  it('is refused for a build that was not measured where the loss was', async () => {
    measureBuild(context, laboratory, 7, { levelsDbuv: [50, 50.2], tags: { line: 'N' } });
    judgeProductNow(context, laboratory.product.id);
    expect((await fix(7, 409)).detail).toBe('build C1 / 1.7 was not measured in 230 V full load, L QP, 0.15-0.5 MHz');
  });

  it('is refused on the word of a bench under suspicion', async () => {
    measureBuild(context, laboratory, 7, { levelsDbuv: [46, 46.2], shape: { floorDbuv: 2 } });
    judgeProductNow(context, laboratory.product.id);
    expect((await fix(7, 409)).detail).toContain('cannot show it in 230 V full load, L QP, 0.15-0.5 MHz: ');
  });

  it('is taken for a newer build with the margin back, and stays in the history', async () => {
    measureBuild(context, laboratory, 7, { levelsDbuv: [50, 50.2], takenAt: dayOf(7) });
    judgeProductNow(context, laboratory.product.id);
    const body = await fix(7, 200);
    expect(body).toMatchObject({ state: 'fixed', fixedBy: { id: buildId(7), hardware: 'C1', firmware: '1.7' } });
    expect(body.history.at(-1).text).toBe('Moved from new to fixed, shown by C1 / 1.7.');
    const reopened = await move(engineer, { state: 'checking', note: 'seen again' });
    expect(reopened).toMatchObject({ state: 'checking', fixedBy: null });
  });
});

describe('who may do what with a drop', () => {
  const changes: [string, (visitor: Visitor) => ReturnType<Visitor['get']>][] = [
    ['move', (visitor) => visitor.post('/api/v1/drops/1/moves').send({ state: 'checking' })],
    ['owner', (visitor) => visitor.put('/api/v1/drops/1/owner').send({ personId: null })],
    ['note', (visitor) => visitor.post('/api/v1/drops/1/notes').send({ text: 'hello' })],
  ];

  it.each(['viewer', 'technician'] as const)('lets a %s read and change nothing', async (role) => {
    const { visitor } = await signInAs(context, app, { teamId: laboratory.team.id, role });
    const { body } = await visitor.get('/api/v1/drops/1').expect(200);
    expect(body).toMatchObject({ moves: [], assignable: [] });
    for (const [, change] of changes) await change(visitor).expect(403);
  });

  it('hides it from another team as if there were none', async () => {
    const { visitor } = await signInAs(context, app, { teamId: buildTeam(context).id, role: 'lead' });
    await visitor.get('/api/v1/drops/1').expect(404);
    await visitor.get(`/api/v1/products/${laboratory.product.key}/drops`).expect(404);
    await visitor.get(`/api/teams/${laboratory.team.key}/drops`).expect(404);
    for (const [, change] of changes) await change(visitor).expect(404);
  });

  it('lets a team the product is shared with read it and never move it, leads included', async () => {
    const { visitor, actor } = await signInAs(context, app, { teamId: buildTeam(context).id, role: 'lead' });
    const [teamId = 0] = actor.roles.keys();
    const share = { productId: laboratory.product.id, teamId, sharedBy: engineerId, createdAt: context.now() };
    context.db.insert(productShares).values(share).run();
    const { body } = await visitor.get('/api/v1/drops/1').expect(200);
    expect(body).toMatchObject({ moves: [], assignable: [] });
    expect((await visitor.get(`/api/v1/products/${laboratory.product.key}/drops`).expect(200)).body).toHaveLength(1);
    for (const [, change] of changes) await change(visitor).expect(403);
  });

  it('lets a token with results:read read it, no token change it, and nobody without a sign-in see it', async () => {
    const reader = buildToken(context, laboratory.team.id, engineerId, ['results:read']);
    const writer = buildToken(context, laboratory.team.id, engineerId, ['sweeps:write']);
    const get = (token: string) => request(app).get('/api/v1/drops/1').set('authorization', `Bearer ${token}`);
    await get(reader).expect(200);
    await get(writer).expect(403);
    await request(app)
      .post('/api/v1/drops/1/moves')
      .set('authorization', `Bearer ${reader}`)
      .send({ state: 'checking' })
      .expect(403);
    await request(app).get('/api/v1/drops/1').expect(401);
  });
});
