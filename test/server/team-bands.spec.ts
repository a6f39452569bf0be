import type { Express } from 'express';
import { eq } from 'drizzle-orm';
import { createApp } from '../../server/app';
import { builds, drops, teams, verdicts } from '../../server/db/schema';
import { judgeProductNow } from '../../server/judging/judge-stale-builds';
import { buildLaboratory, type Laboratory, measureBuild } from '../builders/bench-day';
import { signInAs, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let laboratory: Laboratory;
let lead: Visitor;

beforeEach(async () => {
  context = createTestContext();
  app = createApp(context);
  laboratory = buildLaboratory(context);
  ({ visitor: lead } = await signInAs(context, app, { teamId: laboratory.team.id, role: 'lead' }));
});
afterEach(() => context.close());

const patch = (bands: object[]) => lead.patch(`/api/teams/${laboratory.team.key}`).send({ bands });

/** A build with a quiet line at 1 MHz and a loud one at 1.8 MHz, which is the same in every build. */
function measure(n: number): void {
  const ripple = (n % 3) * 0.2;
  const peaks = [
    [1_000_500, 30 + ripple],
    [1_801_500, 52 + ripple],
  ] as const;
  measureBuild(context, laboratory, n, { levelsDbuv: [0, 0], shape: { peaks } });
}

const verdictsOf = (n: number) => {
  const build = context.db.select().from(builds).where(eq(builds.position, n)).get();
  return context.db
    .select()
    .from(verdicts)
    .where(eq(verdicts.buildId, build?.id ?? 0))
    .all();
};

describe('a band of a team', () => {
  it('that is made wider is another band: nothing is compared with what was taken from the narrower one', async () => {
    await patch([{ name: 'Radio', fromHz: 500e3, toHz: 1.6e6 }]).expect(200);
    for (const n of [1, 2, 3, 4, 5]) measure(n);
    judgeProductNow(context, laboratory.product.id);
    await patch([{ name: 'Radio', fromHz: 500e3, toHz: 2e6 }]).expect(200);
    measure(6);
    judgeProductNow(context, laboratory.product.id);
    const radio = verdictsOf(6).filter(({ band }) => band.startsWith('Radio'));
    expect(radio.map(({ band, verdict }) => [band, verdict])).toEqual([['Radio 0.5-2 MHz', 'cannotSay']]);
    expect(context.db.select().from(drops).all()).toEqual([]);
  });

  it('that the team gave up is judged no more, and its drops are withdrawn', async () => {
    await patch([{ name: 'Radio', fromHz: 500e3, toHz: 1.6e6 }]).expect(200);
    for (const n of [1, 2, 3, 4, 5]) measure(n);
    const peaks = [[1_000_500, 50] as const, [1_801_500, 52] as const];
    measureBuild(context, laboratory, 6, { levelsDbuv: [0, 0], shape: { peaks } });
    judgeProductNow(context, laboratory.product.id);
    const dropsByBand = () =>
      context.db
        .select()
        .from(drops)
        .all()
        .map(({ band, state }) => [band, state]);
    expect(dropsByBand()).toEqual([['Radio 0.5-1.6 MHz', 'new']]);
    await patch([]).expect(200);
    judgeProductNow(context, laboratory.product.id);
    expect(dropsByBand()).toEqual([['Radio 0.5-1.6 MHz', 'withdrawn']]);
    expect(verdictsOf(6).map(({ band }) => band)).toEqual(['0.15-0.5 MHz', '0.5-5 MHz', '5-30 MHz']);
  });

  it('has its range beside its name wherever bands are named', async () => {
    await patch([{ name: '0.5-5 MHz', fromHz: 600e3, toHz: 700e3 }]).expect(200);
    measure(1);
    const path = `/api/v1/products/${laboratory.product.key}/trend`;
    const { body } = await lead.get(path).expect(200);
    expect(body.bands).toEqual(['0.15-0.5 MHz', '0.5-5 MHz', '5-30 MHz', '0.5-5 MHz 0.6-0.7 MHz']);
    const own = await lead.get(`${path}?band=${encodeURIComponent('0.5-5 MHz 0.6-0.7 MHz')}`).expect(200);
    expect(own.body.points[0].worstMarginDb).toBeGreaterThan(40);
  });

  it('is named once', async () => {
    const band = { name: 'Radio', fromHz: 500e3, toHz: 1.6e6 };
    const { body } = await patch([band, { ...band, toHz: 2e6 }]).expect(400);
    expect(body.detail).toBe('bands.1.name: "Radio" names another band already');
    expect(context.db.select().from(teams).where(eq(teams.id, laboratory.team.id)).get()?.bands).toEqual([]);
  });
});
