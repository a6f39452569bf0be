import type { BuildSummary } from '@shared/contracts/builds';
import type { MarginMapView, TrendView } from '@shared/contracts/margins';
import { CELL_COUNT } from '@shared/limits/cells';
import type { Express } from 'express';
import { createApp } from '../../server/app';
import type { Bench } from '../../server/benches/find-bench';
import type { Product } from '../../server/products/product-store';
import { buildSweep } from '../builders/sweep-builder';
import { buildBench, buildProduct, buildTeam } from '../builders/team-builder';
import { signInAs, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let product: Product;
let bench: Bench;
let technician: Visitor;

beforeEach(async () => {
  context = createTestContext();
  app = createApp(context);
  const teamId = buildTeam(context, { key: 'chargers' }).id;
  product = buildProduct(context, teamId, { key: 'psu-240' });
  bench = buildBench(context, teamId);
  technician = (await signInAs(context, app, { teamId, role: 'technician' })).visitor;
});
afterEach(() => context.close());

const list = async (): Promise<BuildSummary[]> =>
  (await technician.get('/api/v1/products/psu-240/builds').expect(200)).body;
const names = async () => (await list()).map(({ firmware, position }) => `${position} ${firmware}`);
const add = (firmware: string, builtAt: string, more = {}) =>
  technician.post('/api/v1/products/psu-240/builds').send({ hardware: 'C1', firmware, builtAt, ...more });

describe('builds', () => {
  it('stand in the order of their dates, whenever they are entered', async () => {
    await add('1.0', '2026-01-01T00:00:00Z').expect(201);
    await add('1.2', '2026-03-01T00:00:00Z').expect(201);
    await add('1.1', '2026-02-01T00:00:00Z').expect(201);
    expect(await names()).toEqual(['1 1.0', '2 1.1', '3 1.2']);
  });

  it('move to their place when their date is put right, both ways, and the newest is the product’s latest', async () => {
    for (const [firmware, month] of [
      ['1.0', '01'],
      ['1.1', '02'],
      ['1.2', '03'],
      ['1.3', '04'],
    ] as const) {
      await add(firmware, `2026-${month}-01T00:00:00Z`).expect(201);
    }
    const [first, , , last] = await list();
    await technician
      .patch(`/api/v1/products/psu-240/builds/${last?.id}`)
      .send({ builtAt: '2026-01-15T00:00:00Z' })
      .expect(200);
    expect(await names()).toEqual(['1 1.0', '2 1.3', '3 1.1', '4 1.2']);
    await technician
      .patch(`/api/v1/products/psu-240/builds/${first?.id}`)
      .send({ builtAt: '2026-05-01T00:00:00Z' })
      .expect(200);
    expect(await names()).toEqual(['1 1.3', '2 1.1', '3 1.2', '4 1.0']);
    const { body } = await technician.get('/api/v1/products/psu-240').expect(200);
    expect(body.latestBuild.firmware).toBe('1.0');
  });

  it('are one for a pair of revisions', async () => {
    await add('1.0', '2026-01-01T00:00:00Z').expect(201);
    const { body } = await add('1.0', '2026-02-01T00:00:00Z').expect(409);
    expect(body.detail).toContain('"1.0"');
  });

  it('keep commit, notes, switching frequencies and parameters; a change leaves the rest alone', async () => {
    const details = {
      commit: '71b6ce43',
      firmwareNotes: 'Ripple reduced',
      switching: [{ stage: 'PFC', frequencyHz: 78_000, spreadPercent: 0 }],
      parameters: [{ name: 'choke', value: '17 mH' }],
    };
    const { body } = await add('1.0', '2026-01-01T00:00:00Z', details).expect(201);
    expect(body).toMatchObject(details);
    const changed = await technician
      .patch(`/api/v1/products/psu-240/builds/${body.id}`)
      .send({ notes: 'second lot' })
      .expect(200);
    expect(changed.body).toMatchObject({ ...details, notes: 'second lot' });
  });

  it('refuse a switching frequency that is none', async () => {
    const { body } = await add('1.0', '2026-01-01T00:00:00Z', {
      switching: [{ stage: 'PFC', frequencyHz: -65_000 }],
    }).expect(400);
    expect(body.detail).toContain('switching.0.frequencyHz');
  });
});

describe('trend and margin map', () => {
  const sweep = (firmware: string, month: string, override: object, levelDbuv: number) =>
    buildSweep(
      context,
      product,
      bench,
      { firmware, takenAt: `2026-${month}-10T08:00:00Z`, ...override },
      { peaks: [[501_000, levelDbuv]] },
    );

  beforeEach(() => {
    sweep('1.0', '01', { line: 'L', run: 'a' }, 44);
    sweep('1.0', '01', { line: 'L', run: 'b', takenAt: '2026-01-11T08:00:00Z' }, 46);
    sweep('1.0', '01', { line: 'N', run: 'a' }, 40);
    sweep('1.2', '03', { line: 'N' }, 50);
  });

  it('show the series with the least margin, the spread of its own runs, and a gap for a build nobody measured', async () => {
    await add('1.1', '2026-02-01T00:00:00Z').expect(201);
    const { body } = await technician.get('/api/v1/products/psu-240/trend').expect(200);
    const { points } = body as TrendView;
    expect(points.map(({ firmware, runs }) => [firmware, runs])).toEqual([
      ['1.0', 2],
      ['1.1', 0],
      ['1.2', 1],
    ]);
    // 56 dBuV (CISPR 32 class B QP, 0.5-5 MHz) less 46 and 44 on L.
    expect(points[0]?.worstMarginDb).toBeCloseTo(10, 3);
    expect(points[0]?.highestDb).toBeCloseTo(12, 3);
    expect(points[1]?.worstMarginDb).toBeNull();
    expect(points[2]?.worstFrequencyHz).toBeCloseTo(501_000, -3);
  });

  it('count one session on two units as two runs, as the judgement does', async () => {
    sweep('1.3', '04', { line: 'L', run: 'a', unit: '0001' }, 44);
    sweep('1.3', '04', { line: 'L', run: 'a', unit: '0002' }, 47);
    const { body } = await technician.get('/api/v1/products/psu-240/trend').expect(200);
    const { runs, lowestDb, highestDb } = (body as TrendView).points.at(-1) ?? {};
    expect(runs).toBe(2);
    expect([lowestDb, highestDb].map((db) => Math.round(db ?? 0))).toEqual([9, 12]);
  });

  it('is read from an index alone', () => {
    const plans = context.db.$client.prepare(
      `explain query plan select build_id, state_id, line, detector, run, bench_id, unit_id, worst_margin_db, worst_frequency_hz
       from sweeps where product_id = 1 and kind = 'product' and is_superseded = 0 order by build_id`,
    );
    expect((plans.all() as { detail: string }[]).map(({ detail }) => detail)).toEqual([
      expect.stringContaining('USING COVERING INDEX sweeps_trend'),
    ]);
  });

  it('count a PK reading only where no QP reading of the same line decides', async () => {
    sweep('1.3', '04', { line: 'L', detector: 'PK' }, 60);
    const worst = async (query = '') =>
      ((await technician.get(`/api/v1/products/psu-240/trend?${query}`).expect(200)).body as TrendView).points.at(-1);
    expect((await worst())?.worstMarginDb).toBeCloseTo(-4, 3);
    sweep('1.3', '04', { line: 'L', detector: 'QP' }, 51);
    expect((await worst())?.worstMarginDb).toBeCloseTo(5, 3);
    expect((await worst('detector=PK'))?.worstMarginDb).toBeCloseTo(-4, 3);
    expect((await list()).at(-1)).toMatchObject({ isOverLimit: false, sweepCount: 2 });
    const map = (await technician.get('/api/v1/products/psu-240/margin-map').expect(200)).body as MarginMapView;
    expect(Math.min(...(map.cells.at(-1) ?? []).map((cell) => cell ?? Infinity))).toBeCloseTo(5, 1);
  });

  it('can be asked for one line, state, detector and band, and refuse what the product does not have', async () => {
    const trend = async (query: string): Promise<TrendView> =>
      (await technician.get(`/api/v1/products/psu-240/trend?${query}`).expect(200)).body;
    expect((await trend('line=N')).points[0]?.worstMarginDb).toBeCloseTo(16, 3);
    const low = await trend('line=N&band=0.15-0.5%20MHz');
    expect(low.points[0]?.worstMarginDb).toBeGreaterThan(30);
    const { body } = await technician.get('/api/v1/products/psu-240/trend?band=2-3%20MHz').expect(400);
    expect(body.detail).toContain('2-3 MHz');
    const unknown = await technician.get('/api/v1/products/psu-240/trend?state=sleep').expect(400);
    expect(unknown.body.detail).toContain('"230 V full load"');
    await technician.get('/api/v1/products/psu-240/trend?line=L9').expect(400);
  });

  it('agree with each other: the least cell of a row is the worst margin, rounded down to hundredths', async () => {
    for (const query of ['', 'line=L', 'line=N', 'detector=QP']) {
      const map = (await technician.get(`/api/v1/products/psu-240/margin-map?${query}`).expect(200))
        .body as MarginMapView;
      const trend = (await technician.get(`/api/v1/products/psu-240/trend?${query}`).expect(200)).body as TrendView;
      expect(map.edgesHz).toHaveLength(CELL_COUNT + 1);
      map.cells.forEach((row, index) => {
        const measured = row.filter((cell): cell is number => cell !== null);
        const worst = trend.points[index]?.worstMarginDb ?? null;
        if (worst === null) expect(measured).toEqual([]);
        else expect(Math.min(...measured)).toBeCloseTo(Math.floor(worst * 100) / 100, 6);
      });
    }
  });
});
