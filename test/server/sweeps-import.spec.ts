import { cellEdgesHz } from '@shared/limits/cells';
import { eq } from 'drizzle-orm';
import type { PersonActor } from '../../server/actor';
import { builds, frequencyGrids, sweeps } from '../../server/db/schema';
import { buildBench, buildPerson, buildProduct, buildTeam } from '../builders/team-builder';
import { buildSweep, buildTags, importBuiltSweep } from '../builders/sweep-builder';
import { createTestContext, type TestContext } from '../support/test-context';

describe('importing a sweep', () => {
  let context: TestContext;
  let actor: PersonActor;
  let product: ReturnType<typeof buildProduct>;
  let bench: ReturnType<typeof buildBench>;

  beforeEach(() => {
    context = createTestContext();
    const team = buildTeam(context);
    actor = buildPerson(context, { teamId: team.id, role: 'technician' }).actor;
    product = buildProduct(context, team.id);
    bench = buildBench(context, team.id);
  });
  afterEach(() => context.close());

  function sweep(id: number) {
    const row = context.db.select().from(sweeps).where(eq(sweeps.id, id)).get();
    if (row === undefined) throw new Error(`sweep ${id} is gone`);
    return row;
  }

  it('holds the levels against the limit of the product', () => {
    const { sweepId } = importBuiltSweep(context, actor, buildTags(product, bench), { peaks: [[5_001_000, 50]] });
    // CISPR 32 class B, mains port, QP: 60 dBuV above 5 MHz (shared/limits/tables/cispr-32.ts).
    expect(sweep(sweepId)).toMatchObject({ worstMarginDb: 10, worstFrequencyHz: 5_001_000, worstLimitDbuv: 60 });
    expect(sweep(sweepId).cells.length).toBe(2 * (cellEdgesHz().length - 1));
  });

  it('stores the grid of many sweeps once', () => {
    importBuiltSweep(context, actor, buildTags(product, bench));
    importBuiltSweep(context, actor, buildTags(product, bench));
    expect(context.db.select().from(frequencyGrids).all()).toHaveLength(1);
  });

  it('gives a built sweep the margins of an imported one', () => {
    const shape = { peaks: [[159_000, 50.5]], seed: 9 } as const;
    const imported = sweep(importBuiltSweep(context, actor, buildTags(product, bench), shape).sweepId);
    const built = sweep(buildSweep(context, product, bench, {}, shape));
    expect({ ...built.bands }).toEqual({ ...imported.bands });
    expect(built.cells).toEqual(imported.cells);
    expect(built.readingHash).toBe(imported.readingHash);
  });

  it('counts in the roll-up of its build', () => {
    const { sweepId } = importBuiltSweep(context, actor, buildTags(product, bench), { peaks: [[5_001_000, 50]] });
    const [build] = context.db.select().from(builds).all();
    expect(build).toMatchObject({ sweepCount: 1, worstMarginDb: 10, worstSweepId: sweepId });
    expect(build?.dataVersion).toBeGreaterThan(0);
  });
});
