import type { OverlayTrace } from '@shared/contracts/sweeps';
import { CELL_COUNT, CELL_NOT_MEASURED } from '@shared/limits/cells';
import { decodeFrames } from '@shared/traces/frames';
import { eq } from 'drizzle-orm';
import type { Express } from 'express';
import request, { type Test } from 'supertest';
import { createApp } from '../../server/app';
import { auditEntries, buildCells, builds, productShares, sweeps, sweepTraces } from '../../server/db/schema';
import { buildLevels, buildSweep, buildSweepFile, buildTags, importBuiltSweep } from '../builders/sweep-builder';
import { buildBench, buildPerson, buildProduct, buildTeam, buildToken } from '../builders/team-builder';
import { signInAs } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let teamId: number;
let lead: ReturnType<typeof buildPerson>;
let token: string;
let product: ReturnType<typeof buildProduct>;
let bench: ReturnType<typeof buildBench>;

beforeEach(() => {
  context = createTestContext();
  app = createApp(context);
  teamId = buildTeam(context, { key: 'chargers' }).id;
  lead = buildPerson(context, { teamId, role: 'lead' });
  token = buildToken(context, teamId, lead.person.id);
  product = buildProduct(context, teamId, { key: 'psu-240' });
  bench = buildBench(context, teamId, { key: 'bench-1' });
});
afterEach(() => context.close());

function get(path: string, bearer = token): Test {
  return request(app).get(path).set('authorization', `Bearer ${bearer}`);
}

function getBytes(path: string, bearer = token): Test {
  return get(path, bearer)
    .set('accept', 'application/octet-stream')
    .buffer(true)
    .parse((response, done) => {
      const chunks: Buffer[] = [];
      response.on('data', (chunk: Buffer) => chunks.push(chunk));
      response.on('end', () => done(null, Buffer.concat(chunks)));
    });
}

async function overlay(query: string, bearer = token) {
  const { body } = await getBytes(`/api/v1/overlay?product=psu-240&${query}`, bearer).expect(200);
  return decodeFrames<OverlayTrace>(new Uint8Array(body as Buffer));
}

function foreignToken(): string {
  const foreign = buildTeam(context).id;
  return buildToken(context, foreign, buildPerson(context, { teamId: foreign, role: 'lead' }).person.id);
}

function build(override: Parameters<typeof buildSweep>[3] = {}, shape: Parameters<typeof buildSweep>[4] = {}): number {
  return buildSweep(context, product, bench, override, shape);
}

describe('GET /api/v1/sweeps/:id', () => {
  it('answers another team’s sweep like one that does not exist', async () => {
    const id = build();
    const stranger = foreignToken();
    for (const path of ['', '/trace', '/file']) {
      const theirs = await get(`/api/v1/sweeps/${id}${path}`, stranger).expect(404);
      const none = await get(`/api/v1/sweeps/9999${path}`, stranger).expect(404);
      expect(theirs.body.detail.replace(id, '9999')).toBe(none.body.detail);
    }
  });

  it('lets a team read the sweeps of a product shared with it, and only those', async () => {
    const id = build();
    const other = buildTeam(context).id;
    const reader = buildToken(context, other, buildPerson(context, { teamId: other, role: 'lead' }).person.id);
    const share = { productId: product.id, teamId: other, sharedBy: lead.person.id, createdAt: context.now() };
    context.db.insert(productShares).values(share).run();
    const unshared = buildSweep(context, buildProduct(context, teamId), bench);
    await get(`/api/v1/sweeps/${id}`, reader).expect(200);
    await get(`/api/v1/sweeps/${unshared}`, reader).expect(404);
    await request(app).delete(`/api/v1/sweeps/${id}`).set('authorization', `Bearer ${reader}`).expect(403);
    expect((await get('/api/v1/sweeps?product=psu-240', reader).expect(200)).body.sweeps).toHaveLength(1);
    expect((await overlay(`sweeps=${id}`, reader)).traces).toHaveLength(1);
  });
});

describe('GET /api/v1/sweeps/:id/trace', () => {
  it('gives the levels of the file, in JSON and in binary alike, over the limit', async () => {
    const shape = { seed: 5, peaks: [[1_500_000, 61.27]] } as const;
    const { sweepId } = importBuiltSweep(context, lead.actor, buildTags(product, bench), shape);
    const written = buildLevels(shape);
    const { body: json } = await get(`/api/v1/sweeps/${sweepId}/trace`).expect(200);
    const binary = decodeFrames<OverlayTrace>(
      new Uint8Array((await getBytes(`/api/v1/sweeps/${sweepId}/trace`).expect(200)).body as Buffer),
    );
    expect(Float32Array.from(json.levelsDbuv)).toEqual(written);
    expect(binary.traces[0]?.levelsDbuv).toEqual(written);
    expect(Array.from(binary.grids[0] ?? [])).toEqual(json.frequenciesHz);
    expect(json.levelsDbuv[300]).toBe(61.27);
    // CISPR 32 class B, mains port, QP: 66 dBuV at 150 kHz, 56 dBuV from 0.5 to 5 MHz, 60 dBuV to 30 MHz.
    expect(json.limitsDbuv[0]).toBe(66);
    expect(json.limitsDbuv[300]).toBe(56);
    expect(json.limitsDbuv.at(-1)).toBe(60);
    expect(binary.traces[0]?.meta.limit.detector).toBe('QP');
  });

  it('keeps levels that hundredths of a dB cannot hold', async () => {
    const levels = Array.from({ length: 40 }, (_, i) => -60 - i / 7);
    const rows = levels.map((level, i) => `${150 + i * 4.5};${level}`).join('\n');
    const post = request(app).post('/api/v1/sweeps').set('authorization', `Bearer ${token}`);
    const { body } = await post
      .field('tags', JSON.stringify(buildTags(product, bench, { frequencyUnit: 'kHz', levelUnit: 'dBm' })))
      .attach('file', Buffer.from(rows), 'a.csv')
      .expect(201);
    const trace = await get(`/api/v1/sweeps/${body.sweep.id}/trace`).expect(200);
    // 10 log10(50 ohm * 1 mW / (1 uV)^2) = 106.9897 dB.
    const expected = levels.map((level) => Math.fround(level + 10 * Math.log10(50e9)));
    expect(trace.body.levelsDbuv.map(Math.fround)).toEqual(expected);
  });
});

describe('GET /api/v1/sweeps/:id/file', () => {
  it('gives back the very bytes under their name, never as a page', async () => {
    const file = buildSweepFile();
    const post = request(app).post('/api/v1/sweeps').set('authorization', `Bearer ${token}`);
    const { body } = await post
      .field('tags', JSON.stringify(buildTags(product, bench)))
      .attach('file', file, '<b>größe.html')
      .expect(201);
    const answer = await getBytes(`/api/v1/sweeps/${body.sweep.id}/file`).expect(200);
    expect((answer.body as Buffer).equals(file)).toBe(true);
    expect(answer.headers['content-type']).toMatch(/^application\/octet-stream/);
    expect(answer.headers['x-content-type-options']).toBe('nosniff');
    expect(answer.headers['content-disposition']).toContain("filename*=UTF-8''%3Cb%3Egr%C3%B6%C3%9Fe.html");
  });
});

describe('GET /api/v1/sweeps', () => {
  it('filters and pages, newest first', async () => {
    const first = build({ detector: 'PK' });
    const second = build({ line: 'N', state: 'standby' });
    const third = build({ hardware: 'C2' });
    const ids = async (query: string) => (await get(`/api/v1/sweeps?${query}`).expect(200)).body;
    const seen = async (query: string) => (await ids(query)).sweeps.map(({ id }: { id: number }) => id);
    expect(await seen('')).toEqual([third, second, first]);
    expect(await seen('detector=PK')).toEqual([first]);
    expect(await seen('line=N&state=standby&bench=bench-1&kind=product')).toEqual([second]);
    expect(await seen('team=chargers&state=elsewhere')).toEqual([]);
    expect(await seen('product=psu-240&kind=background')).toEqual([]);
    const buildId = (await get(`/api/v1/sweeps/${third}`)).body.buildId;
    expect(await seen(`build=${buildId}`)).toEqual([third]);
    const page = await ids('limit=2');
    expect(page.nextBefore).toBe(second);
    expect(await ids(`limit=2&before=${page.nextBefore}`)).toMatchObject({ sweeps: [{ id: first }], nextBefore: null });
  });

  it('shows nothing of another team', async () => {
    build();
    const stranger = foreignToken();
    expect((await get('/api/v1/sweeps', stranger).expect(200)).body.sweeps).toEqual([]);
    await get('/api/v1/sweeps?team=chargers', stranger).expect(404);
    await get('/api/v1/sweeps?product=psu-240', stranger).expect(404);
  });
});

describe('GET /api/v1/overlay', () => {
  it('picks of every build and series the worst sweep of the newest run', async () => {
    build({ run: 'old', takenAt: '2026-03-01T08:00:00Z' }, { peaks: [[159_000, 64]] });
    build({ run: 'new', takenAt: '2026-03-02T08:00:00Z' }, { peaks: [[159_000, 50]] });
    const worst = build({ run: 'new', takenAt: '2026-03-02T08:10:00Z' }, { peaks: [[159_000, 55]] });
    const average = build({ detector: 'AV' });
    const other = build({ hardware: 'C2', takenAt: '2026-03-05T08:00:00Z' });
    const [one, two] = context.db.select({ id: builds.id }).from(builds).orderBy(builds.position).all();
    const { traces, grids } = await overlay(`builds=${two?.id},${one?.id}`);
    expect(traces.map(({ meta }) => meta.sweepId)).toEqual([average, worst, other]);
    expect(grids).toHaveLength(1);
    expect(traces[1]?.meta).toMatchObject({
      label: 'C1 / 2.4.1, 230 V full load, L QP',
      detector: 'QP',
      kind: 'product',
    });
    expect(traces[1]?.meta.worst?.levelDbuv).toBe(55);
    expect(traces[1]?.meta.limit.segments[0]).toEqual({ fromHz: 150e3, toHz: 500e3, fromDbuv: 66, toDbuv: 56 });
    const narrowed = await overlay(`builds=${one?.id}&detector=QP&line=L&state=230%20V%20full%20load`);
    expect(narrowed.traces.map(({ meta }) => meta.sweepId)).toEqual([worst]);
  });

  it('adds the background of the bench and day when asked', async () => {
    const day = '2026-03-02T';
    const sweep = build({ takenAt: `${day}08:00:00Z` });
    build({ kind: 'background', takenAt: '2026-02-20T08:00:00Z' });
    const background = build({ kind: 'background', takenAt: `${day}07:30:00Z` });
    build({ kind: 'background', takenAt: `${day}07:40:00Z`, line: 'N' });
    const { traces } = await overlay(`sweeps=${sweep}&kind=background`);
    expect(traces.map(({ meta }) => meta.sweepId)).toEqual([sweep, background]);
    expect(traces[1]?.meta.label).toBe('Background of bench-1, 230 V full load, L QP');
    expect((await overlay(`sweeps=${sweep}`)).traces).toHaveLength(1);
  });

  it('refuses more traces than one picture holds and sweeps of another product', async () => {
    const shape = { frequenciesHz: Float64Array.from({ length: 20 }, (_, i) => 150e3 + i * 4500) };
    for (let i = 0; i < 41; i++) build({ state: `state ${i}` }, { ...shape, peaks: [] });
    const [{ id = 0 } = {}] = context.db.select({ id: builds.id }).from(builds).all();
    const many = await getBytes(`/api/v1/overlay?product=psu-240&builds=${id}`).expect(400);
    expect(String(many.body)).toContain('an overlay holds 40 traces, these are 41');
    const foreign = buildSweep(context, buildProduct(context, teamId), bench, {}, { ...shape, peaks: [] });
    await get(`/api/v1/overlay?product=psu-240&sweeps=${foreign}`).expect(404);
    await get('/api/v1/overlay?product=psu-240&sweeps=1,x').expect(400);
  });
});

describe('DELETE /api/v1/sweeps/:id', () => {
  it('needs an engineer and leaves a line in the audit log', async () => {
    const id = build();
    const technician = await signInAs(context, app, { teamId, role: 'technician' });
    const engineer = await signInAs(context, app, { teamId, role: 'engineer' });
    await technician.visitor.delete(`/api/v1/sweeps/${id}`).expect(403);
    await request(app).delete(`/api/v1/sweeps/${id}`).set('authorization', `Bearer ${token}`).expect(403);
    await engineer.visitor.delete(`/api/v1/sweeps/${id}`).expect(204);
    await engineer.visitor.get(`/api/v1/sweeps/${id}`).expect(404);
    expect(context.db.select().from(sweepTraces).all()).toEqual([]);
    const entries = context.db.select().from(auditEntries).where(eq(auditEntries.action, 'sweep.removed')).all();
    expect(entries).toMatchObject([{ subjectId: String(id), teamId, actorName: engineer.actor.name }]);
  });

  it('leaves the roll-up that the remaining sweeps give, and the build to be judged again', async () => {
    const { visitor } = await signInAs(context, app, { teamId, role: 'engineer' });
    const ids = [50, 62, 44, 58].map((level, i) =>
      build({ line: i % 2 ? 'N' : 'L', detector: i > 1 ? 'QP' : 'PK' }, { peaks: [[159_000 + i * 450_000, level]] }),
    );
    build({ kind: 'background' }, { peaks: [[159_000, 80]] });
    build({ kind: 'checkSource' }, { peaks: [[159_000, 80]] });
    const later = build({ hardware: 'C2', takenAt: '2026-03-09T08:00:00Z' });
    const versions = () =>
      context.db.select({ version: builds.dataVersion }).from(builds).orderBy(builds.position).all();
    for (const id of [ids[1], ids[3], ids[0]]) {
      const before = versions();
      await visitor.delete(`/api/v1/sweeps/${id}`).expect(204);
      expectRollUpOfSweeps();
      expect(versions().map(({ version }, i) => version > (before[i]?.version ?? 0))).toEqual([true, true]);
    }
    await visitor.delete(`/api/v1/sweeps/${ids[2]}`).expect(204);
    const [empty] = context.db.select().from(builds).orderBy(builds.position).all();
    expect(empty).toMatchObject({ sweepCount: 0, worstMarginDb: null, worstSweepId: null });
    expect(context.db.select().from(buildCells).all()).toHaveLength(1);
    expect((await visitor.get(`/api/v1/sweeps/${later}`)).status).toBe(200);
  });
});

/** Compares every roll-up with a plain recomputation from the sweeps. */
function expectRollUpOfSweeps(): void {
  for (const build of context.db.select().from(builds).all()) {
    const counted = context.db
      .select()
      .from(sweeps)
      .where(eq(sweeps.buildId, build.id))
      .all()
      .filter(({ kind }) => kind === 'product');
    const cells = context.db.select().from(buildCells).where(eq(buildCells.buildId, build.id)).get();
    // All traces have one grid here, so QP decides wherever it was measured on the line.
    const decisive = counted.filter(
      ({ detector, line }) => detector !== 'PK' || !counted.some((s) => s.detector === 'QP' && s.line === line),
    );
    const margins = decisive.map(({ worstMarginDb }) => worstMarginDb ?? Infinity);
    expect(build.sweepCount).toBe(counted.length);
    expect(build.worstMarginDb).toBe(Math.min(...margins));
    expect(counted.find(({ id }) => id === build.worstSweepId)?.worstMarginDb).toBe(build.worstMarginDb);
    expect([...int16(cells?.cells)]).toEqual(leastOf(decisive.map((sweep) => sweep.cells)));
    cells?.series.forEach(({ stateId, line, detector }, index) => {
      const own = counted.filter((s) => s.stateId === stateId && s.line === line && s.detector === detector);
      const row = int16(cells.tile).subarray(index * CELL_COUNT, (index + 1) * CELL_COUNT);
      expect([...row]).toEqual(leastOf(own.map((sweep) => sweep.cells)));
    });
    expect(cells?.tile.length).toBe((cells?.series.length ?? 0) * CELL_COUNT * 2);
  }
}

function int16(bytes: Buffer = Buffer.alloc(0)): Int16Array {
  return new Int16Array(Uint8Array.from(bytes).buffer);
}

function leastOf(vectors: Buffer[]): number[] {
  const rows = vectors.map(int16);
  return Array.from({ length: CELL_COUNT }, (_, cell) => {
    const measured = rows.map((row) => row[cell] ?? CELL_NOT_MEASURED).filter((margin) => margin !== CELL_NOT_MEASURED);
    return measured.length === 0 ? CELL_NOT_MEASURED : Math.min(...measured);
  });
}
