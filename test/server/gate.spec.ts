import { eq } from 'drizzle-orm';
import type { Express } from 'express';
import request, { type Test } from 'supertest';
import { createApp } from '../../server/app';
import { drops, operatingStates, referenceChoices } from '../../server/db/schema';
import { judgeProductNow } from '../../server/judging/judge-stale-builds';
import { buildLaboratory, type Laboratory, measureBuild } from '../builders/bench-day';
import { buildPerson, buildTeam, buildToken } from '../builders/team-builder';
import { signInAs } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let laboratory: Laboratory;
let leadId: number;

beforeEach(() => {
  context = createTestContext();
  app = createApp(context);
  laboratory = buildLaboratory(context);
  leadId = buildPerson(context, { teamId: laboratory.team.id, role: 'lead' }).person.id;
  for (const n of [1, 2, 3, 4, 5]) measureBoth(n, [50 + 0.1 * n]);
});
afterEach(() => context.close());

/** QP as given and AV 12 dB below, under a limit 10 dB lower: both lines of the limit plan. */
function measureBoth(n: number, levelsDbuv: number[], state = '230 V full load'): void {
  measureBuild(context, laboratory, n, { levelsDbuv, tags: { state } });
  const average = levelsDbuv.map((levelDbuv) => levelDbuv - 12);
  measureBuild(context, laboratory, n, {
    levelsDbuv: average,
    shape: { floorDbuv: 0 },
    tags: { state, detector: 'AV' },
  });
}

function gate(
  firmware: string,
  query = '',
  scopes?: Parameters<typeof buildToken>[3],
  teamId = laboratory.team.id,
): Test {
  return request(app)
    .get(`/api/v1/products/${laboratory.product.key}/gate?hardware=C1&firmware=${firmware}${query}`)
    .set('authorization', `Bearer ${buildToken(context, teamId, leadId, scopes)}`);
}

function judge(): void {
  judgeProductNow(context, laboratory.product.id);
}

describe('the gate', () => {
  it('passes a judged build that holds and has its target margin in every required series', async () => {
    measureBoth(6, [50.2, 50.4]);
    judge();
    const { body } = await gate('1.6').expect(200);
    expect(body).toEqual({
      verdict: 'pass',
      product: laboratory.product.key,
      hardware: 'C1',
      firmware: '1.6',
      targetMarginDb: 6,
      reasons: [],
    });
  });

  it('passes the first build on its margins alone', async () => {
    judge();
    expect((await gate('1.1').expect(200)).body.verdict).toBe('pass');
  });

  it('fails a lost margin, and one short of the target the pipeline names', async () => {
    measureBoth(6, [56.2, 56.4]);
    judge();
    const { body } = await gate('1.6').expect(200);
    expect(body.verdict).toBe('fail');
    expect(body.reasons.map(({ code }: { code: string }) => code)).toEqual(['lost', 'lost']);
    expect(body.reasons[0].text).toBe('230 V full load, L QP, 0.15-0.5 MHz: lost 6.0 dB of margin');
    const { body: strict } = await gate('1.5', '&targetMarginDb=20').expect(200);
    expect(strict).toMatchObject({ verdict: 'fail', targetMarginDb: 20 });
    expect(strict.reasons[0].code).toBe('underTarget');
  });

  it('lists a loss the team accepted and does not stop at it, unless its margin is short of the target', async () => {
    measureBoth(6, [56.2, 56.4]);
    judge();
    context.db.update(drops).set({ state: 'accepted' }).run();
    const { body } = await gate('1.6').expect(200);
    expect(body.verdict).toBe('pass');
    expect(body.reasons.map(({ code }: { code: string }) => code)).toEqual(['acceptedLoss', 'acceptedLoss']);
    expect((await gate('1.6', '&targetMarginDb=12').expect(200)).body.verdict).toBe('fail');
  });

  it('goes on with a loss that was accepted on an earlier build, and stops at one that grew since', async () => {
    context.db
      .insert(referenceChoices)
      .values({ productId: laboratory.product.id, buildId: 5, chosenBy: leadId, chosenAt: 1, reason: 'released' })
      .run();
    measureBoth(6, [56.2, 56.4]);
    judge();
    measureBoth(7, [56.3, 56.4]);
    judge();
    expect((await gate('1.7').expect(200)).body.verdict).toBe('fail');
    context.db.update(drops).set({ state: 'accepted' }).run();
    const { body } = await gate('1.7').expect(200);
    expect(body.verdict).toBe('pass');
    expect(body.reasons.map(({ code }: { code: string }) => code)).toEqual(['acceptedLoss', 'acceptedLoss']);
    measureBoth(8, [59.3, 59.4]);
    judge();
    expect((await gate('1.8').expect(200)).body.verdict).toBe('fail');
  });

  it('fails what is over the limit', async () => {
    measureBoth(6, [67, 67.1]);
    judge();
    const { body } = await gate('1.6').expect(200);
    expect(body.verdict).toBe('fail');
    expect(body.reasons[0]).toMatchObject({ code: 'overLimit' });
  });

  it('is incomplete before the build is judged, and when sweeps came in since', async () => {
    expect((await gate('1.5').expect(200)).body).toMatchObject({ verdict: 'incomplete' });
    judge();
    expect((await gate('1.5').expect(200)).body).toMatchObject({ verdict: 'pass' });
    measureBoth(5, [50.9]);
    const { body } = await gate('1.5').expect(200);
    expect(body).toMatchObject({ verdict: 'incomplete', reasons: [{ code: 'notJudged' }] });
  });

  it('is incomplete where a required state was not measured, and does not ask for one that is not required', async () => {
    measureBoth(1, [50], '115 V half load');
    measureBoth(6, [50.2, 50.4]);
    judge();
    const { body } = await gate('1.6').expect(200);
    expect(body.verdict).toBe('incomplete');
    expect(body.reasons[0]).toEqual({
      code: 'notMeasured',
      text: '115 V half load, L QP, 0.15-0.5 MHz: not measured',
    });
    context.db
      .update(operatingStates)
      .set({ isRequired: false })
      .where(eq(operatingStates.name, '115 V half load'))
      .run();
    expect((await gate('1.6').expect(200)).body.verdict).toBe('pass');
  });

  it('is incomplete without the AV line of the limit plan, or without a line earlier builds were measured on', async () => {
    measureBuild(context, laboratory, 6, { levelsDbuv: [50.2, 50.4] });
    judge();
    const { body } = await gate('1.6').expect(200);
    expect(body.verdict).toBe('incomplete');
    expect(body.reasons.map(({ text }: { text: string }) => text)).toEqual([
      '230 V full load, L AV, 0.15-0.5 MHz: not measured',
      '230 V full load, L AV, 0.5-5 MHz: not measured',
      '230 V full load, L AV, 5-30 MHz: not measured',
    ]);
    measureBuild(context, laboratory, 5, { levelsDbuv: [50], tags: { line: 'N' } });
    judge();
    const texts = (await gate('1.6').expect(200)).body.reasons.map(({ text }: { text: string }) => text);
    expect(texts).toContain('230 V full load, N QP, 0.15-0.5 MHz: not measured');
  });

  it('takes PK readings that clear both lines for both', async () => {
    for (const n of [6, 7])
      measureBuild(context, laboratory, n, { levelsDbuv: [40.2, 40.4], tags: { detector: 'PK' } });
    judge();
    expect((await gate('1.7').expect(200)).body).toMatchObject({ verdict: 'pass', reasons: [] });
  });

  it('counts the QP reading where PK was over its line', async () => {
    measureBoth(6, [50.2, 50.4]);
    measureBuild(context, laboratory, 6, { levelsDbuv: [70], tags: { detector: 'PK' } });
    judge();
    expect((await gate('1.6').expect(200)).body).toMatchObject({ verdict: 'pass', reasons: [] });
  });

  it('is incomplete when the bench is under suspicion', async () => {
    measureBuild(context, laboratory, 6, { levelsDbuv: [46.2, 46.4], shape: { floorDbuv: 8 } });
    measureBuild(context, laboratory, 6, {
      levelsDbuv: [34.2, 34.4],
      shape: { floorDbuv: -4 },
      tags: { detector: 'AV' },
    });
    judge();
    const { body } = await gate('1.6').expect(200);
    expect(body.verdict).toBe('incomplete');
    expect(body.reasons[0]).toMatchObject({
      code: 'cannotSay',
      text: expect.stringContaining('the whole curve moved'),
    });
  });

  it('reads with gate:read in the owning team only', async () => {
    judge();
    await gate('1.5', '', ['gate:read']).expect(200);
    await gate('1.5', '', ['results:read']).expect(403);
    await gate('1.5', '', undefined, buildTeam(context).id).expect(404);
    await gate('9.9').expect(404);
    await gate('1.5', '&targetMarginDb=high').expect(400);
    const { visitor } = await signInAs(context, app, { teamId: laboratory.team.id, role: 'viewer' });
    await visitor.get(`/api/v1/products/${laboratory.product.key}/gate?hardware=C1&firmware=1.5`).expect(200);
  });
});

describe('the gate as a JUnit report', () => {
  it('has a case for every band of every series, failed or skipped as the gate says', async () => {
    context.db.update(operatingStates).set({ name: 'R&D "full" <load>' }).run();
    measureBuild(context, laboratory, 6, { levelsDbuv: [56.2, 56.4], tags: { state: 'R&D "full" <load>' } });
    judge();
    const { text, type } = await gate('1.6', '&format=junit').expect(200);
    expect(type).toBe('application/xml');
    expect(text).toContain('tests="7" failures="1" errors="0" skipped="3"');
    const title = `${laboratory.product.key} C1 / 1.6`;
    const state = 'R&amp;D &quot;full&quot; &lt;load&gt;';
    expect(text.split('\n').slice(3, -3)).toEqual([
      `<testcase classname="${title}.judgement" name="is up to date"/>`,
      `<testcase classname="${title}.${state}" name="L QP 0.15-0.5 MHz"><failure message="${state}, L QP, 0.15-0.5 MHz: lost 6.0 dB of margin"/></testcase>`,
      `<testcase classname="${title}.${state}" name="L QP 0.5-5 MHz"/>`,
      `<testcase classname="${title}.${state}" name="L QP 5-30 MHz"/>`,
      `<testcase classname="${title}.${state}" name="L AV 0.15-0.5 MHz"><skipped message="${state}, L AV, 0.15-0.5 MHz: not measured"/></testcase>`,
      `<testcase classname="${title}.${state}" name="L AV 0.5-5 MHz"><skipped message="${state}, L AV, 0.5-5 MHz: not measured"/></testcase>`,
      `<testcase classname="${title}.${state}" name="L AV 5-30 MHz"><skipped message="${state}, L AV, 5-30 MHz: not measured"/></testcase>`,
    ]);
  });

  it('is no clean report while the build is not judged', async () => {
    const { text } = await gate('1.5', '&format=junit').expect(200);
    expect(text).toContain('name="is up to date"><skipped message="the build is not judged');
  });
});
