import type { ImportBatchView, ImportPlan, PreviewTrace } from '@shared/contracts/imports';
import type * as z from 'zod';
import { decodeFrames } from '@shared/traces/frames';
import { and, eq } from 'drizzle-orm';
import type { Express } from 'express';
import request, { type Test } from 'supertest';
import { importJob } from '../../jobs/import';
import { workOnce } from '../../jobs/worker';
import { createApp } from '../../server/app';
import { importItems, jobRuns, memberships, people, sweeps } from '../../server/db/schema';
import { claimRun, LEASE_MS } from '../../server/queue/claim-run';
import { HeldRun, RunLostError } from '../../server/queue/held-run';
import { importBatch } from '../../server/sweeps/import-batch';
import { requestOpenBatches } from '../../server/sweeps/request-batches';
import { buildLevels, buildSweepFile, buildTags } from '../builders/sweep-builder';
import { buildBench, buildProduct, buildTeam, buildToken } from '../builders/team-builder';
import { countStored } from '../support/count-stored';
import { signInAs, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

type PlanInput = z.input<typeof ImportPlan>;

let context: TestContext;
let app: Express;
let teamId: number;
let visitor: Visitor;
let personId: number;
let product: ReturnType<typeof buildProduct>;
let bench: ReturnType<typeof buildBench>;

beforeEach(async () => {
  context = createTestContext();
  app = createApp(context);
  teamId = buildTeam(context, { key: 'chargers' }).id;
  const technician = await signInAs(context, app, { teamId, role: 'technician' });
  visitor = technician.visitor;
  personId = technician.actor.personId;
  product = buildProduct(context, teamId, { key: 'psu-240' });
  bench = buildBench(context, teamId, { key: 'bench-1' });
});
afterEach(() => context.close());

function post(files: readonly Buffer[], plan: unknown, by: Visitor = visitor): Test {
  const test = by.post('/api/teams/chargers/imports').field('plan', JSON.stringify(plan));
  files.forEach((file, index) => test.attach('files', file, `sweep-${index + 1}.csv`));
  return test;
}

/** Everything but line and detector once for all. */
function planOf(items: PlanInput['items']): PlanInput {
  const { line: _line, detector: _detector, ...tags } = buildTags(product, bench);
  return { tags, items };
}

async function progress(id: number): Promise<ImportBatchView> {
  return (await visitor.get(`/api/teams/chargers/imports/${id}`).expect(200)).body as ImportBatchView;
}

function work(): Promise<boolean> {
  return workOnce(context, 'worker', [importJob]);
}

function files(count: number): Buffer[] {
  return Array.from({ length: count }, () => buildSweepFile());
}

describe('POST /api/teams/:team/readings', () => {
  const file = () => {
    const rows = Array.from(buildLevels({ seed: 3 }), (level, i) => `${150e3 + i * 4500},${level + 2},${level}`);
    return Buffer.from(`RBW,9 kHz\nFrequency [Hz],QP L [dBuV],AV L [dBuV]\n${rows.join('\n')}\n`);
  };
  const read = (content: Buffer) => visitor.post('/api/teams/chargers/readings').attach('file', content, 'a.csv');

  it('says what was recognised and stores nothing', async () => {
    const before = countStored(context);
    const { body } = await read(file()).expect(200);
    expect(body).toMatchObject({
      fileName: 'a.csv',
      pointCount: 6634,
      startHz: 150e3,
      frequencyUnit: 'Hz',
      delimiter: ',',
      rbwHz: 9000,
      traces: [
        { trace: 1, name: 'QP L', levelUnit: 'dBuV', detector: 'QP', line: 'L', highestDbuv: 52 },
        { trace: 2, name: 'AV L', levelUnit: 'dBuV', detector: 'AV', line: 'L', highestDbuv: 50 },
      ],
      remarks: [],
    });
    expect(countStored(context)).toEqual(before);
  });

  it('gives the lines above the table, and the time among them in the zone of the team', async () => {
    const content = Buffer.concat([Buffer.from('Date,02.07.2026 09:20:15\n'), file()]);
    const { body } = await read(content).expect(200);
    expect(body.preamble).toEqual([
      { line: 1, key: 'Date', value: '02.07.2026 09:20:15' },
      { line: 2, key: 'RBW', value: '9 kHz' },
    ]);
    // Lisbon is one hour ahead of UTC in July (IANA time zone database).
    expect(body.takenAt).toBe('2026-07-02T08:20:15.000Z');
    expect(body.inferred).toContainEqual({
      what: 'taken at',
      value: '2026-07-02 09:20:15',
      why: 'line 1 says so without a zone; read in Europe/Lisbon',
    });
    const zoned = Buffer.concat([Buffer.from('Date,2026-03-02T09:20:15+02:00\n'), file()]);
    expect((await read(zoned).expect(200)).body).toMatchObject({ takenAt: '2026-03-02T07:20:15.000Z', inferred: [] });
    expect((await read(file()).expect(200)).body.takenAt).toBeNull();
  });

  it('gives every level in a frame when asked for one', async () => {
    const chunks: Buffer[] = [];
    await read(file())
      .set('accept', 'application/octet-stream')
      .buffer(true)
      .parse((response, done) => {
        response.on('data', (chunk: Buffer) => chunks.push(chunk));
        response.on('end', () => done(null, null));
      })
      .expect(200);
    const { grids, traces } = decodeFrames<PreviewTrace>(new Uint8Array(Buffer.concat(chunks)));
    expect(grids.map((grid) => grid.length)).toEqual([6634]);
    expect(traces.map(({ meta }) => meta.detector)).toEqual(['QP', 'AV']);
    expect(traces[1]?.levelsDbuv).toEqual(buildLevels({ seed: 3 }));
  });

  it('takes a unit the file leaves out and names the place of a fault', async () => {
    const bare = Buffer.from(buildSweepFile({}, '').toString().trim());
    const missing = await read(bare).expect(422);
    expect(missing.body).toMatchObject({
      type: '/problems/unreadable',
      expected: expect.stringContaining('dBuV'),
      needs: 'levelUnit',
    });
    await read(bare).field('options', '{"levelUnit":"dBuV"}').expect(200);
  });

  it('is for those who may add sweeps', async () => {
    const viewer = await signInAs(context, app, { teamId, role: 'viewer' });
    await viewer.visitor.post('/api/teams/chargers/readings').attach('file', file(), 'a.csv').expect(403);
    const stranger = await signInAs(context, app, { teamId: buildTeam(context).id, role: 'lead' });
    await stranger.visitor.post('/api/teams/chargers/readings').attach('file', file(), 'a.csv').expect(404);
  });
});

describe('a batch of files', () => {
  it('is taken at once and imported by the jobs process, with progress', async () => {
    const bad = Buffer.from('no sweep at all');
    const [good, twin] = files(2);
    const { body } = await post([good ?? bad, bad, twin ?? bad], {
      ...planOf([
        { file: 0, tags: { line: 'L', detector: 'QP' } },
        { file: 1, tags: { line: 'N', detector: 'QP' } },
        { file: 2, tags: { line: 'N', detector: 'QP', corrected: false, hardware: 'C2' } },
        { file: 0, tags: { line: 'L', detector: 'QP' } },
      ]),
    }).expect(202);
    expect(body).toMatchObject({ total: 4, waiting: 4, imported: 0, finishedAt: null, run: { status: 'waiting' } });
    expect(await work()).toBe(true);
    const done = await progress(body.id);
    expect(done).toMatchObject({ total: 4, waiting: 0, imported: 2, duplicate: 1, refused: 1 });
    expect(done.run).toMatchObject({ status: 'done', done: 4, counts: { imported: 2, duplicate: 1, refused: 1 } });
    expect(done.finishedAt).not.toBeNull();
    expect(done.items.map(({ status }) => status)).toEqual(['imported', 'refused', 'imported', 'duplicate']);
    expect(done.items[1]?.problem).toMatchObject({ type: '/problems/unreadable', status: 422 });
    expect(done.items[3]?.sweepId).toBe(done.items[0]?.sweepId);
    expect(done.items[0]).toMatchObject({ productKey: 'psu-240', productName: product.name, fileName: 'sweep-1.csv' });
    expect(done.items[0]?.worstMarginDb).toBeGreaterThan(0);
    const stored = context.db.select().from(sweeps).all();
    expect(stored.map(({ correction }) => correction)).toEqual(['inFile', 'none']);
    expect(stored.every(({ importedById, batchId }) => importedById === personId && batchId === body.id)).toBe(true);
    const list = (await visitor.get('/api/teams/chargers/imports').expect(200)).body as ImportBatchView[];
    expect(list).toMatchObject([{ id: body.id, imported: 2, items: [] }]);
    const judging = context.db
      .select()
      .from(jobRuns)
      .all()
      .filter(({ job }) => job === 'judge');
    expect(judging).toMatchObject([{ status: 'waiting', trigger: 'import', payload: { productId: product.id } }]);
  });

  it('is refused whole when its tags are not complete, naming the item', async () => {
    const answer = await post(files(1), planOf([{ file: 0, tags: { line: 'L' } }])).expect(400);
    expect(answer.body.errors[0].path).toBe('items.0.tags.detector');
    await post(files(1), planOf([{ file: 1, tags: { line: 'L', detector: 'QP' } }])).expect(400);
    await post(files(1), planOf([])).expect(400);
    const { files: _files, ...rows } = countStored(context);
    expect(rows).toMatchObject({ import_batches: 0, import_items: 0, job_runs: 0 });
  });

  it('is refused whole when a file is larger than the installation reads, and keeps nothing of that file', async () => {
    const large = Buffer.alloc(context.config.maxUploadBytes + 1, '1');
    const answer = await post([large], planOf([{ file: 0, tags: { line: 'L', detector: 'QP' } }]));
    expect(answer).toMatchObject({ status: 413, body: { type: '/problems/tooLarge' } });
    expect(countStored(context)).toMatchObject({ import_batches: 0, files: 0 });
  });

  it('takes the time of the upload where the tags have none, however late it is imported', async () => {
    const uploadedAt = context.now();
    const { tags } = planOf([]);
    const { takenAt: _takenAt, ...rest } = tags;
    await post(files(1), { tags: rest, items: [{ file: 0, tags: { line: 'L', detector: 'QP' } }] }).expect(202);
    context.clock.advance(3600_000);
    await work();
    expect(context.db.select().from(sweeps).get()?.takenAt).toBe(uploadedAt);
  });

  it('is for people of the team who may add sweeps', async () => {
    const items = [{ file: 0, tags: { line: 'L', detector: 'QP' } as const }];
    const { body } = await post(files(1), planOf(items)).expect(202);
    const viewer = await signInAs(context, app, { teamId, role: 'viewer' });
    await post(files(1), planOf(items), viewer.visitor).expect(403);
    await viewer.visitor.get(`/api/teams/chargers/imports/${body.id}`).expect(200);
    buildTeam(context, { key: 'drives' });
    const stranger = await signInAs(context, app, { teamId: buildTeam(context).id, role: 'lead' });
    await stranger.visitor.get(`/api/teams/chargers/imports/${body.id}`).expect(404);
    const token = buildToken(context, teamId, personId);
    await request(app)
      .post('/api/teams/chargers/imports')
      .set('authorization', `Bearer ${token}`)
      .field('plan', JSON.stringify(planOf(items)))
      .attach('files', buildSweepFile(), 'a.csv')
      .expect(403);
  });

  it('is imported with the rights its sender has by then', async () => {
    await post(files(1), planOf([{ file: 0, tags: { line: 'L', detector: 'QP' } }])).expect(202);
    context.db
      .update(memberships)
      .set({ role: 'viewer' })
      .where(and(eq(memberships.teamId, teamId), eq(memberships.personId, personId)))
      .run();
    await work();
    expect(context.db.select().from(importItems).get()).toMatchObject({
      status: 'refused',
      problem: { type: '/problems/forbidden' },
    });
    context.db.update(people).set({ disabledAt: context.now() }).where(eq(people.id, personId)).run();
    context.db.update(importItems).set({ status: 'waiting' }).run();
    context.db.update(jobRuns).set({ status: 'waiting' }).run();
    await work();
    expect(context.db.select().from(importItems).get()?.problem?.detail).toContain('no account any more');
    expect(context.db.select().from(sweeps).all()).toEqual([]);
  });
});

describe('an import that is broken off', () => {
  const items = ['L', 'N', 'L', 'N'].map((line, file) => ({
    file,
    tags: { line: line as 'L' | 'N', detector: 'QP' as const, hardware: `C${file}` },
  }));

  /** A worker whose process is gone after so many files. */
  class DyingRun extends HeldRun {
    private left = 0;

    diesAfter(count: number): this {
      this.left = count;
      return this;
    }

    override advance(outcome: string): void {
      super.advance(outcome);
      this.left -= 1;
      if (this.left === 0) throw new Error('the machine lost power');
    }
  }

  function claim(worker: string) {
    const run = claimRun(context, worker, ['import']);
    if (run === undefined) throw new Error('there is no run to claim');
    return run;
  }

  it('is finished by another worker, with nothing lost and nothing twice', async () => {
    const { body } = await post(files(4), planOf(items)).expect(202);
    const dying = new DyingRun(context, claim('first'), 'first').diesAfter(2);
    await expect(importBatch(context, dying)).rejects.toThrow('lost power');
    expect(await progress(body.id)).toMatchObject({ imported: 2, waiting: 2, finishedAt: null });
    expect(claimRun(context, 'second', ['import'])).toBeUndefined();

    context.clock.advance(LEASE_MS + 1);
    const held = new HeldRun(context, claim('second'), 'second');
    await importBatch(context, held);
    held.finish();
    expect(await progress(body.id)).toMatchObject({ imported: 4, waiting: 0, duplicate: 0, refused: 0 });
    expect(context.db.select().from(sweeps).all()).toHaveLength(4);
  });

  it('stops a worker that was only slow as soon as another has taken over', async () => {
    const { body } = await post(files(4), planOf(items)).expect(202);
    const slow = new HeldRun(context, claim('slow'), 'slow');
    context.clock.advance(LEASE_MS + 1);
    const quick = new HeldRun(context, claim('quick'), 'quick');
    await expect(importBatch(context, slow)).rejects.toThrow(RunLostError);
    await importBatch(context, quick);
    quick.finish();
    expect(await progress(body.id)).toMatchObject({ waiting: 0, refused: 0, finishedAt: expect.any(String) });
    expect(context.db.select().from(sweeps).all()).toHaveLength(4);
  });

  it('survives two workers on the same files at once', async () => {
    await post(files(4), planOf(items)).expect(202);
    const run = claim('one');
    context.clock.advance(LEASE_MS + 1);
    const quick = new HeldRun(context, claim('two'), 'two');
    const both = await Promise.allSettled([
      importBatch(context, new HeldRun(context, run, 'one')),
      importBatch(context, quick),
    ]);
    expect(both.map(({ status }) => status)).toEqual(['rejected', 'fulfilled']);
    expect(context.db.select().from(sweeps).all()).toHaveLength(4);
    expect(
      new Set(
        context.db
          .select()
          .from(importItems)
          .all()
          .map(({ sweepId }) => sweepId),
      ).size,
    ).toBe(4);
  });

  it('is asked for again at the start and on schedule until it is finished', async () => {
    const { body } = await post(files(2), planOf(items.slice(0, 2))).expect(202);
    context.db.delete(jobRuns).run();
    requestOpenBatches(context, 'start');
    requestOpenBatches(context, 'schedule');
    expect(context.db.select().from(jobRuns).all()).toHaveLength(1);
    await work();
    expect(await progress(body.id)).toMatchObject({ imported: 2, waiting: 0 });
    requestOpenBatches(context, 'schedule');
    expect(await work()).toBe(false);
  });

  it('leaves a file waiting when the database is at fault, not the file', async () => {
    const { body } = await post(files(1), planOf(items.slice(0, 1))).expect(202);
    const full = Object.assign(new Error('database or disk is full'), { code: 'SQLITE_FULL' });
    const broken: TestContext = {
      ...context,
      originals: Object.create(context.originals, {
        read: {
          value: () => {
            throw full;
          },
        },
      }) as TestContext['originals'],
    };
    await workOnce(broken, 'worker', [importJob]);
    expect(await progress(body.id)).toMatchObject({ waiting: 1, run: { status: 'failed' } });
    requestOpenBatches(context, 'schedule');
    await work();
    expect(await progress(body.id)).toMatchObject({ imported: 1 });
  });
});

describe('GET /api/teams/:team/last-tags', () => {
  it('gives the tags of the caller’s own last sweep, without time, run and trace', async () => {
    expect((await visitor.get('/api/teams/chargers/last-tags').expect(200)).body).toBeNull();
    await post(files(1), planOf([{ file: 0, tags: { line: 'N', detector: 'AV', unit: '0009' } }])).expect(202);
    await work();
    const { takenAt: _takenAt, ...tags } = buildTags(product, bench, { line: 'N', detector: 'AV', unit: '0009' });
    expect((await visitor.get('/api/teams/chargers/last-tags').expect(200)).body).toEqual({ ...tags, kind: 'product' });
    const other = await signInAs(context, app, { teamId, role: 'technician' });
    expect((await other.visitor.get('/api/teams/chargers/last-tags').expect(200)).body).toBeNull();
  });
});
