import type { Express } from 'express';
import request, { type Test } from 'supertest';
import { judgeJob } from '../../jobs/judge';
import { workOnce } from '../../jobs/worker';
import { createApp } from '../../server/app';
import { jobRuns } from '../../server/db/schema';
import { judgeProductNow } from '../../server/judging/judge-stale-builds';
import { enqueueRun } from '../../server/queue/enqueue-run';
import { waitForRun } from '../../server/queue/wait-for-run';
import { buildLaboratory, type Laboratory, measureBuild, measureQuietBuilds } from '../builders/bench-day';
import { buildPerson, buildProduct, buildTeam, buildToken } from '../builders/team-builder';
import { signInAs } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let laboratory: Laboratory;
let product: string;
let leadId: number;

beforeEach(() => {
  context = createTestContext();
  app = createApp(context);
  laboratory = buildLaboratory(context);
  product = laboratory.product.key;
  leadId = buildPerson(context, { teamId: laboratory.team.id, role: 'lead' }).person.id;
  measureQuietBuilds(context, laboratory);
  measureBuild(context, laboratory, 6, { levelsDbuv: [56.1, 55.9] });
});
afterEach(() => context.close());

function withToken(test: Test, scopes?: Parameters<typeof buildToken>[3], teamId = laboratory.team.id): Test {
  return test.set('authorization', `Bearer ${buildToken(context, teamId, leadId, scopes)}`);
}

describe('GET verdicts', () => {
  const path = () => `/api/v1/products/${product}/verdicts?hardware=C1&firmware=1.6`;

  it('gives the judgement of one build, band by band, with its reference', async () => {
    judgeProductNow(context, laboratory.product.id);
    const { body } = await withToken(request(app).get(path())).expect(200);
    expect(body).toMatchObject({ product, hardware: 'C1', firmware: '1.6', verdict: 'lost', isStale: false });
    expect(body).toMatchObject({ methodVersion: 1, referenceKind: 'pooled', unmeasuredStates: [] });
    expect(body.referenceBuilds.map((one: { firmware: string }) => one.firmware)).toEqual([
      '1.1',
      '1.2',
      '1.3',
      '1.4',
      '1.5',
    ]);
    expect(body.verdicts.map((one: { band: string; verdict: string }) => [one.band, one.verdict])).toEqual([
      ['0.15-0.5 MHz', 'lost'],
      ['0.5-5 MHz', 'held'],
      ['5-30 MHz', 'held'],
    ]);
    expect(body.verdicts[0]).toMatchObject({ state: '230 V full load', line: 'L', detector: 'QP', isOverLimit: false });
    expect(body.verdicts[0].judgement.spread).toMatchObject({ source: expect.any(String), sdDb: expect.any(Number) });
  });

  it('says of a build that is not judged yet that it is not', async () => {
    const { body } = await withToken(request(app).get(path())).expect(200);
    expect(body).toMatchObject({ verdict: null, isStale: true, judgedAt: null, verdicts: [], referenceKind: null });
  });

  it('knows no build of revisions that were never measured', async () => {
    await withToken(request(app).get(`/api/v1/products/${product}/verdicts?hardware=C1&firmware=9`)).expect(404);
    await withToken(request(app).get(`/api/v1/products/${product}/verdicts?hardware=C1`)).expect(400);
  });

  it('is read with results:read in the owning team only', async () => {
    await withToken(request(app).get(path()), ['sweeps:write']).expect(403);
    await withToken(request(app).get(path()), undefined, buildTeam(context).id).expect(404);
    await request(app).get(path()).expect(401);
  });
});

describe('POST evaluate', () => {
  const path = () => `/api/v1/products/${product}/evaluate`;

  it('answers 202 with the run, which can be followed by whoever asked', async () => {
    const { body: run } = await withToken(request(app).post(path()), ['sweeps:write']).expect(202);
    expect(run).toMatchObject({ job: 'judge', trigger: 'token', requestedBy: 'bench script', status: 'waiting' });
    await workOnce(context, 'worker', [judgeJob]);
    const { body } = await withToken(request(app).get(`/api/v1/runs/${run.id}`), ['sweeps:write']).expect(200);
    expect(body).toMatchObject({ id: run.id, status: 'done', total: 6, done: 6 });
  });

  it('waits for the end when asked to, and then answers 200 with the run', async () => {
    const answer = withToken(request(app).post(`${path()}?wait=true`)).then((response) => response);
    while (!(await workOnce(context, 'worker', [judgeJob]))) await new Promise((resolve) => setImmediate(resolve));
    const { status, body } = await answer;
    expect(status).toBe(200);
    expect(body).toMatchObject({ status: 'done', counts: { lost: 1 } });
  });

  it('gives up waiting when no worker takes the run', async () => {
    const actor = { kind: 'job', name: 'test' } as const;
    const request = { job: 'judge', teamId: null, lockKey: 'judge:1', trigger: 'person' } as const;
    const run = enqueueRun(context, actor, request);
    expect(await waitForRun(context, run.id, 150)).toMatchObject({ id: run.id, status: 'waiting' });
  });

  it('needs a technician, or a token that may write sweeps, of the owning team', async () => {
    await withToken(request(app).post(path()), ['results:read']).expect(403);
    await withToken(request(app).post(path()), undefined, buildTeam(context).id).expect(404);
    const { visitor: viewer } = await signInAs(context, app, { teamId: laboratory.team.id, role: 'viewer' });
    await viewer.post(path()).expect(403);
    const { visitor: technician } = await signInAs(context, app, { teamId: laboratory.team.id, role: 'technician' });
    expect((await technician.post(path()).expect(202)).body).toMatchObject({ trigger: 'person' });
    expect(context.db.select().from(jobRuns).all()).toHaveLength(1);
  });
});

describe('judge now', () => {
  const path = () => `/api/teams/${laboratory.team.key}/judge`;

  it('lets a lead start the judging of all products of the team, or of one', async () => {
    const other = buildProduct(context, laboratory.team.id);
    const { visitor } = await signInAs(context, app, { teamId: laboratory.team.id, role: 'lead', name: 'Mara Lind' });
    const { body: one } = await visitor.post(path()).send({ product: other.key }).expect(202);
    expect(one.runs).toHaveLength(1);
    const { body: all } = await visitor.post(path()).expect(202);
    expect(all.runs).toHaveLength(2);
    expect(all.runs[0]).toMatchObject({ requestedBy: 'Mara Lind', trigger: 'person' });
    await visitor.post(path()).send({ product: 'none' }).expect(404);
  });

  it('is for leads of the team', async () => {
    const { visitor: engineer } = await signInAs(context, app, { teamId: laboratory.team.id, role: 'engineer' });
    await engineer.post(path()).expect(403);
    const { visitor: stranger } = await signInAs(context, app, { teamId: buildTeam(context).id, role: 'lead' });
    await stranger.post(path()).expect(404);
    await withToken(request(app).post(path())).expect(403);
  });
});

describe('runs of jobs', () => {
  it('are listed for the team, newest first, and shown to nobody else', async () => {
    const { visitor } = await signInAs(context, app, { teamId: laboratory.team.id, role: 'viewer' });
    const { body: run } = await withToken(request(app).post(`/api/v1/products/${product}/evaluate`)).expect(202);
    await workOnce(context, 'worker', [judgeJob]);
    await withToken(request(app).post(`/api/v1/products/${product}/evaluate`)).expect(202);
    const { body } = await visitor.get(`/api/teams/${laboratory.team.key}/jobs`).expect(200);
    expect(body.map(({ status }: { status: string }) => status)).toEqual(['waiting', 'done']);

    const { visitor: stranger } = await signInAs(context, app, { teamId: buildTeam(context).id, role: 'lead' });
    await stranger.get(`/api/v1/runs/${run.id}`).expect(404);
    await stranger.get(`/api/teams/${laboratory.team.key}/jobs`).expect(404);
    await request(app).get(`/api/v1/runs/${run.id}`).expect(401);
  });

  it('of the installation belong to no team', async () => {
    const actor = { kind: 'job', name: 'prune' } as const;
    const run = enqueueRun(context, actor, { job: 'prune', teamId: null, lockKey: 'prune', trigger: 'schedule' });
    const { visitor } = await signInAs(context, app, { teamId: laboratory.team.id, role: 'lead' });
    await visitor.get(`/api/v1/runs/${run.id}`).expect(404);
  });
});
