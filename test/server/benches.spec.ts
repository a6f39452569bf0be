import type { BenchView } from '@shared/contracts/benches';
import { LIMIT_SETS } from '@shared/limits/limit-sets';
import { eq } from 'drizzle-orm';
import type { Express } from 'express';
import request from 'supertest';
import { createApp } from '../../server/app';
import { auditEntries, verdicts } from '../../server/db/schema';
import { judgeProductNow } from '../../server/judging/judge-stale-builds';
import { buildSweep } from '../builders/sweep-builder';
import { buildBench, buildProduct, buildTeam } from '../builders/team-builder';
import { signInAs } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let teamId: number;

beforeEach(() => {
  context = createTestContext();
  app = createApp(context);
  teamId = buildTeam(context, { key: 'chargers' }).id;
});
afterEach(() => context.close());

describe('benches', () => {
  it('are added and changed by an engineer, each change in the audit log once', async () => {
    const { visitor } = await signInAs(context, app, { teamId, role: 'engineer' });
    const input = { key: 'bench-2', name: 'Screened room', lisn: '50 uH', receiver: '9 kHz receiver' };
    const { body } = await visitor.post('/api/teams/chargers/benches').send(input).expect(201);
    expect(body).toMatchObject({ ...input, location: '', isArchived: false, sweepCount: 0, lastSweepAt: null });
    await visitor.post('/api/teams/chargers/benches').send(input).expect(409);
    await visitor
      .post('/api/teams/chargers/benches')
      .send({ ...input, key: 'Bench 3' })
      .expect(400);
    const change = { lisn: '50 uH, second', isArchived: true };
    const changed = await visitor.patch('/api/teams/chargers/benches/bench-2').send(change).expect(200);
    expect(changed.body).toMatchObject({ ...input, ...change });
    await visitor.patch('/api/teams/chargers/benches/bench-2').send(change).expect(200);
    const entries = context.db.select().from(auditEntries).all();
    expect(entries.map(({ action }) => action)).toEqual(['bench.created', 'bench.changed']);
    expect(entries[1]?.details).toMatchObject({ lisn: { from: '50 uH', to: '50 uH, second' } });
  });

  it('list their use and the planning spread', async () => {
    const { visitor } = await signInAs(context, app, { teamId, role: 'viewer' });
    const bench = buildBench(context, teamId, { key: 'bench-1' });
    const product = buildProduct(context, teamId);
    buildSweep(context, product, bench, { takenAt: '2026-03-02T08:00:00Z' });
    buildSweep(context, product, bench, { takenAt: '2026-03-01T08:00:00Z' });
    const { body } = await visitor.get('/api/teams/chargers/benches').expect(200);
    expect(body).toMatchObject([
      {
        key: 'bench-1',
        sweepCount: 2,
        lastSweepAt: '2026-03-02T08:00:00.000Z',
        spread: { sdDb: 0.7, degreesOfFreedom: 4, source: "planning value, not yet this bench's own" },
      },
    ]);
  });

  it('show the spread that the last judgement used, with where it comes from', async () => {
    const { visitor } = await signInAs(context, app, { teamId, role: 'viewer' });
    const bench = buildBench(context, teamId, { key: 'bench-1' });
    const product = buildProduct(context, teamId, { key: 'psu-240' });
    for (const day of [1, 2, 3, 4, 5, 6]) {
      const tags = { firmware: `1.${day}`, takenAt: `2026-03-0${day}T08:00:00Z` };
      buildSweep(context, product, bench, tags, { peaks: [[159_000, 50 + (day % 2)]] });
    }
    judgeProductNow(context, product.id);
    const { body } = await visitor.get('/api/teams/chargers/benches').expect(200);
    const { spread } = (body as BenchView[])[0] ?? {};
    expect(spread?.source).toMatch(
      /^from runs between which nothing changed .*; the widest band of psu-240 C1 \/ 1\.6, as judged$/,
    );
    const used = context.db.select().from(verdicts).where(eq(verdicts.buildId, 6)).all();
    expect(spread?.sdDb).toBe(Math.max(...used.map(({ judgement }) => judgement.spread?.sdDb ?? 0)));
  });

  it('are closed to viewers and unknown to other teams', async () => {
    const viewer = await signInAs(context, app, { teamId, role: 'viewer' });
    const stranger = await signInAs(context, app, { teamId: buildTeam(context).id, role: 'lead' });
    buildBench(context, teamId, { key: 'bench-1' });
    await viewer.visitor.post('/api/teams/chargers/benches').send({ key: 'b', name: 'B' }).expect(403);
    await viewer.visitor.patch('/api/teams/chargers/benches/bench-1').send({ name: 'B' }).expect(403);
    await stranger.visitor.get('/api/teams/chargers/benches').expect(404);
    await stranger.visitor.patch('/api/teams/chargers/benches/bench-1').send({ name: 'B' }).expect(404);
  });
});

describe('GET /api/v1/limits', () => {
  it('lists every limit set with its source, to whoever is signed in', async () => {
    await request(app).get('/api/v1/limits').expect(401);
    const { visitor } = await signInAs(context, app, { teamId, role: 'viewer' });
    const { body } = await visitor.get('/api/v1/limits').expect(200);
    expect(body.map(({ key }: { key: string }) => key)).toEqual(LIMIT_SETS.map(({ key }) => key));
    expect(body[0].source).not.toBe('');
    expect(body[0].lines[0].segments[0]).toMatchObject({ fromHz: 150e3 });
  });
});
