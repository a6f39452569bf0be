import type { Role } from '@shared/access/roles';
import type { ProductSummary, ProductView } from '@shared/contracts/products';
import type { Express } from 'express';
import { createApp } from '../../server/app';
import { auditEntries } from '../../server/db/schema';
import { buildSweep } from '../builders/sweep-builder';
import { buildBench, buildProduct, buildTeam } from '../builders/team-builder';
import { signInAs, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let teamId: number;

beforeEach(() => {
  context = createTestContext();
  app = createApp(context);
  teamId = buildTeam(context, { key: 'chargers', targetMarginDb: 6 }).id;
});
afterEach(() => context.close());

const as = async (role: Role, team = teamId): Promise<Visitor> =>
  (await signInAs(context, app, { teamId: team, role })).visitor;
const input = { key: 'psu-240', name: 'Supply 240 W', limitSetKey: 'CISPR32_B' };

describe('products', () => {
  it('are created by a lead, under a key the team has once', async () => {
    const lead = await as('lead');
    const created = await lead.post('/api/v1/products?team=chargers').send(input).expect(201);
    expect(created.body).toMatchObject({
      ...input,
      team: 'chargers',
      targetMarginDb: 6,
      ownTargetMarginDb: null,
      buildCount: 0,
    });
    const again = await lead.post('/api/v1/products?team=chargers').send(input).expect(409);
    expect(again.body.detail).toContain('"psu-240"');
    const wrong = await lead
      .post('/api/v1/products?team=chargers')
      .send({ ...input, key: 'x', limitSetKey: 'CLASS_Z' })
      .expect(400);
    expect(wrong.body.detail).toContain('"CLASS_Z"');
  });

  it.each(['viewer', 'technician', 'engineer'] as const)('are not created or changed by a %s', async (role) => {
    const product = buildProduct(context, teamId);
    const visitor = await as(role);
    await visitor.post('/api/v1/products?team=chargers').send(input).expect(403);
    await visitor.patch(`/api/v1/products/${product.key}`).send({ name: 'Other' }).expect(403);
    await visitor.put(`/api/v1/products/${product.key}/shares`).send({ teams: [] }).expect(403);
    await visitor
      .put(`/api/v1/products/${product.key}/reference`)
      .send({ buildId: null, reason: 'because' })
      .expect(403);
    await visitor.get(`/api/v1/products/${product.key}`).expect(200);
  });

  it('change only in what the change names, and the change is in the audit log', async () => {
    const product = buildProduct(context, teamId, { description: 'Bench supply', targetMarginDb: 4 });
    const lead = await as('lead');
    const { body } = await lead.patch(`/api/v1/products/${product.key}`).send({ name: 'Renamed' }).expect(200);
    expect(body).toMatchObject({ name: 'Renamed', description: 'Bench supply', ownTargetMarginDb: 4 });
    expect(context.db.select().from(auditEntries).all()).toMatchObject([
      { action: 'product.changed', details: { before: { name: product.name }, now: { name: 'Renamed' } } },
    ]);
  });

  it('keep their limit plan once sweeps have margins to it', async () => {
    const product = buildProduct(context, teamId);
    const lead = await as('lead');
    await lead.patch(`/api/v1/products/${product.key}`).send({ limitSetKey: 'CISPR32_A' }).expect(200);
    buildSweep(context, { ...product, limitSetKey: 'CISPR32_A' }, buildBench(context, teamId));
    const refused = await lead.patch(`/api/v1/products/${product.key}`).send({ limitSetKey: 'CISPR32_B' }).expect(409);
    expect(refused.body.detail).toContain('CISPR32_A');
  });

  it('show how they stand: worst margin, unmeasured states, trend', async () => {
    const product = buildProduct(context, teamId, { key: 'psu-240' });
    const bench = buildBench(context, teamId);
    const lead = await as('lead');
    await lead.post('/api/v1/products/psu-240/states').send({ name: '115 V full load' }).expect(201);
    await lead.post('/api/v1/products/psu-240/states').send({ name: 'standby', isRequired: false }).expect(201);
    buildSweep(
      context,
      product,
      bench,
      { firmware: '1.0', takenAt: '2026-01-10T08:00:00Z' },
      { peaks: [[501_000, 44]] },
    );
    buildSweep(
      context,
      product,
      bench,
      { firmware: '1.1', takenAt: '2026-02-10T08:00:00Z' },
      { peaks: [[501_000, 51]] },
    );
    const { body } = await lead.get('/api/v1/products?team=chargers').expect(200);
    const [summary] = body as ProductSummary[];
    expect(summary).toMatchObject({
      buildCount: 2,
      latestBuild: { firmware: '1.1' },
      unmeasuredStates: ['115 V full load'],
      targetMarginDb: 6,
    });
    // Class B QP is 56 dBuV from 0.5 to 5 MHz (CISPR 32): 56 - 51 and 56 - 44.
    expect(summary?.latestBuild?.worstMarginDb).toBeCloseTo(5, 3);
    expect(summary?.trend.map((margin) => Math.round((margin ?? 0) * 100) / 100)).toEqual([12, 5]);
    expect(summary?.previousWorstMarginDb).toBeCloseTo(12, 3);
  });
});

describe('a shared product', () => {
  it('is read by the other team and nothing more, and is gone when the share ends', async () => {
    buildTeam(context, { key: 'drives' });
    const drives = buildTeam(context, { key: 'lighting' });
    const product = buildProduct(context, teamId, { key: 'psu-240' });
    buildSweep(context, product, buildBench(context, teamId));
    const lead = await as('lead');
    const stranger = await as('lead', drives.id);
    await stranger.get('/api/v1/products/psu-240').expect(404);

    await lead
      .put('/api/v1/products/psu-240/shares')
      .send({ teams: ['lighting'] })
      .expect(200);
    const { body } = await stranger.get('/api/v1/products/psu-240').expect(200);
    expect(body as ProductView).toMatchObject({ team: 'chargers', isShared: true, sharedWith: [] });
    for (const path of ['builds', 'trend', 'margin-map', 'drops']) {
      await stranger.get(`/api/v1/products/psu-240/${path}?team=chargers`).expect(200);
    }
    await stranger.patch('/api/v1/products/psu-240').send({ name: 'Mine' }).expect(403);
    await stranger
      .post('/api/v1/products/psu-240/builds')
      .send({ hardware: 'X', firmware: '1', builtAt: '2026-01-01T00:00:00Z' })
      .expect(403);
    await stranger.post('/api/v1/products/psu-240/evaluate').expect(403);

    await lead.put('/api/v1/products/psu-240/shares').send({ teams: [] }).expect(200);
    await stranger.get('/api/v1/products/psu-240').expect(404);
  });

  it('with a key several teams use asks for the team', async () => {
    const drives = buildTeam(context, { key: 'drives' });
    buildProduct(context, teamId, { key: 'psu-240' });
    buildProduct(context, drives.id, { key: 'psu-240' });
    const { visitor, actor } = await signInAs(context, app, { teamId, role: 'viewer' });
    context.db.$client
      .prepare('insert into memberships values (?, ?, ?, ?)')
      .run(drives.id, actor.personId, 'viewer', 0);
    const { body } = await visitor.get('/api/v1/products/psu-240').expect(400);
    expect(body.detail).toContain('chargers, drives');
    const chosen = await visitor.get('/api/v1/products/psu-240?team=drives').expect(200);
    expect(chosen.body.team).toBe('drives');
  });
});

describe('the reference build', () => {
  it('is chosen with a reason, marks every measured build for judging and stands in the audit log', async () => {
    const product = buildProduct(context, teamId, { key: 'psu-240' });
    const bench = buildBench(context, teamId);
    buildSweep(context, product, bench, { firmware: '1.0', takenAt: '2026-01-10T08:00:00Z' });
    buildSweep(context, product, bench, { firmware: '1.1', takenAt: '2026-02-10T08:00:00Z' });
    const lead = await as('lead');
    const { body: builds } = await lead.get('/api/v1/products/psu-240/builds').expect(200);
    const choice = { buildId: builds[0].id, reason: 'passed at the test house' };
    await lead
      .put('/api/v1/products/psu-240/reference')
      .send({ ...choice, reason: '' })
      .expect(400);
    await lead
      .put('/api/v1/products/psu-240/reference')
      .send({ ...choice, buildId: 999 })
      .expect(404);
    const { body } = await lead.put('/api/v1/products/psu-240/reference').send(choice).expect(200);
    expect(body.reference).toMatchObject({ buildId: builds[0].id, firmware: '1.0', reason: choice.reason });
    const { body: after } = await lead.get('/api/v1/products/psu-240/builds').expect(200);
    expect(after).toMatchObject([
      { isReference: true, isStale: true },
      { isReference: false, isStale: true },
    ]);
    expect(context.db.select().from(auditEntries).all().at(-1)).toMatchObject({ action: 'reference.chosen' });
  });
});
