import { asc, eq } from 'drizzle-orm';
import { auditEntries, builds, drops, dropEvents, dropSightings, sweeps, verdicts } from '../../server/db/schema';
import { moveDrop } from '../../server/drops/move-drop';
import { judgeOneBuild } from '../../server/judging/judge-one-build';
import { judgeProductNow } from '../../server/judging/judge-stale-builds';
import { markStale } from '../../server/judging/mark-stale';
import { chooseReference } from '../../server/products/choose-reference';
import { findProduct } from '../../server/products/find-product';
import { buildLaboratory, dayOf, type Laboratory, measureBuild } from '../builders/bench-day';
import { buildPerson } from '../builders/team-builder';
import { createTestContext, type TestContext } from '../support/test-context';

/** A laboratory whose builds are judged against build 2; the line stands at 50 dBuV, 15.5 dB under the limit. */
class Bench {
  readonly context: TestContext = createTestContext();
  readonly laboratory: Laboratory = buildLaboratory(this.context);
  readonly engineer = buildPerson(this.context, { teamId: this.laboratory.team.id, role: 'lead' }).actor;

  constructor() {
    this.measure(1, 50, 50.2);
    this.measure(2, 49.9, 50.1, 50);
    const found = findProduct(this.context, this.engineer, this.laboratory.product.key, undefined, 'references.choose');
    chooseReference(this.context, this.engineer, found, { buildId: this.idOf(2), reason: 'released' });
    this.judge();
  }

  /** Runs of build `n` with the line at these levels, after those it has. The ripple follows from build and run alone. */
  measure(n: number, ...levelsDbuv: number[]): number[] {
    const before = this.context.db.select().from(sweeps).all().length;
    return levelsDbuv.flatMap((levelDbuv, index) =>
      measureBuild(this.context, this.laboratory, n, {
        levelsDbuv: [levelDbuv],
        takenAt: dayOf(n) + (before + index) * 60_000,
        shape: { seed: n * 1000 + Math.round(levelDbuv * 10) },
      }),
    );
  }

  forget(sweepIds: readonly number[]): void {
    for (const id of sweepIds)
      this.context.db.update(sweeps).set({ kind: 'checkSource' }).where(eq(sweeps.id, id)).run();
    markStale(this.context, this.laboratory.product.id, 1);
    this.judge();
  }

  judge(): void {
    judgeProductNow(this.context, this.laboratory.product.id);
  }

  measureAndJudge(n: number, ...levelsDbuv: number[]): number[] {
    const ids = this.measure(n, ...levelsDbuv);
    this.judge();
    return ids;
  }

  idOf(n: number): number {
    const rows = this.context.db.select().from(builds).orderBy(asc(builds.position)).all();
    const day = dayOf(n);
    return rows.find(({ builtAt }) => builtAt >= day && builtAt < dayOf(n + 1))?.id ?? 0;
  }

  drops() {
    const rows = this.context.db
      .select({ drop: drops, position: builds.position })
      .from(drops)
      .innerJoin(builds, eq(builds.id, drops.buildId))
      .orderBy(asc(drops.id))
      .all();
    return rows.map(({ drop, position }) => `${position} ${drop.state}`);
  }

  dropRow(id: number) {
    const row = this.context.db.select().from(drops).where(eq(drops.id, id)).get();
    if (row === undefined) throw new Error(`there is no drop ${id}`);
    return row;
  }

  /** What a drop's history says, its raising apart. */
  history(dropId: number): string[] {
    return this.context.db
      .select()
      .from(dropEvents)
      .where(eq(dropEvents.dropId, dropId))
      .orderBy(asc(dropEvents.id))
      .all()
      .slice(1)
      .map(({ text }) => text);
  }

  /** Everything about drops, with the same name for every bench. */
  told(): string {
    const { drops: rows, sightings, events } = this.stored();
    return JSON.stringify({ rows, sightings, events }, null, 1).replaceAll(this.laboratory.bench.key, 'bench');
  }

  stored() {
    const { db } = this.context;
    return {
      verdicts: db
        .select()
        .from(verdicts)
        .orderBy(verdicts.buildId, verdicts.band, verdicts.line, verdicts.detector)
        .all()
        .map(({ id: _id, ...row }) => row),
      drops: db.select().from(drops).all(),
      sightings: db.select().from(dropSightings).orderBy(asc(dropSightings.id)).all(),
      events: db.select().from(dropEvents).orderBy(asc(dropEvents.id)).all(),
      audited: db.select().from(auditEntries).where(eq(auditEntries.subjectKind, 'drop')).all().length,
    };
  }
}

let bench: Bench;
const open: Bench[] = [];

function openBench(): Bench {
  const opened = new Bench();
  open.push(opened);
  return opened;
}

beforeEach(() => (bench = openBench()));
afterEach(() => open.splice(0).forEach(({ context }) => context.close()));

// Levels by hand: reference 50.0 dBuV, limit of class B at 159 kHz 65.5 dBuV (CISPR 32, table A.10).
describe('a drop that is still there in the next builds', () => {
  it('is not raised again: its history says so once a build, and the verdict stays lost', () => {
    bench.measureAndJudge(3, 56.1, 55.9);
    bench.measureAndJudge(4, 56.4, 56.2);
    bench.measureAndJudge(5, 55.8, 56);
    expect(bench.drops()).toEqual(['3 new']);
    expect(bench.history(1)).toEqual([
      'Still there in C1 / 1.4: -6.3 dB, 9.1 dB left to the limit.',
      'Still there in C1 / 1.5: -5.9 dB, 9.5 dB left to the limit.',
    ]);
    const verdictsOf = bench.context.db.select().from(builds).orderBy(asc(builds.position)).all();
    expect(verdictsOf.slice(2).map(({ verdict }) => verdict)).toEqual(['lost', 'lost', 'lost']);
  });

  it('says how far it is over the limit', () => {
    bench.measureAndJudge(3, 66.6, 66.4);
    bench.measureAndJudge(4, 66.8, 66.9);
    expect(bench.history(1)).toEqual(['Still there in C1 / 1.4: -16.9 dB, 1.4 dB over the limit.']);
  });

  it('takes on a further run of a build with one line, and none for less than 0.1 dB', () => {
    bench.measureAndJudge(3, 56.1, 55.9);
    bench.measureAndJudge(4, 56.2, 56.1);
    const [seen] = bench.stored().sightings;
    bench.measureAndJudge(4, 56.17);
    expect(bench.history(1)).toHaveLength(1);
    expect(bench.stored().sightings).toEqual([seen]);
    bench.measureAndJudge(4, 56.8);
    expect(bench.history(1).slice(1)).toEqual([
      'Still there in C1 / 1.4: -6.3 dB, 8.7 dB left to the limit; was -6.1 dB, 9.3 dB left to the limit.',
    ]);
  });

  it('takes back what a build said when its data no longer show it, and goes on when they do again', () => {
    bench.measureAndJudge(3, 56.1, 55.9);
    bench.measureAndJudge(4, 56.2, 56.1);
    const contradicting = bench.measureAndJudge(4, 50, 50.2, 50.1, 49.9, 50, 50.1, 49.8);
    expect(bench.stored().sightings).toEqual([]);
    expect(bench.history(1)[1]).toMatch(/^C1 \/ 1\.4 is no longer judged lost: L QP cannot say \(-1\.8 dB\): /);
    bench.forget(contradicting);
    expect(bench.history(1)[2]).toBe('Still there in C1 / 1.4: -6.1 dB, 9.3 dB left to the limit.');
    expect(bench.drops()).toEqual(['3 new']);
  });

  it('keeps its state and owner while it carries on', () => {
    bench.measureAndJudge(3, 56.1, 55.9);
    moveDrop(bench.context, bench.engineer, 1, { state: 'checking', note: '' });
    bench.context.clock.advance(1000);
    bench.measureAndJudge(4, 56.2, 56.1);
    expect(bench.dropRow(1)).toMatchObject({ state: 'checking', updatedAt: bench.context.now() });
  });
});

describe('the same rows', () => {
  /** A loss, still there, gone, back, worse, still worse, gone. */
  const HISTORY: [number, ...number[]][] = [
    [3, 56.1, 55.9],
    [4, 56.4, 56.2],
    [5, 50.1, 50.3],
    [6, 56.1, 56],
    [7, 60.1, 60.3],
    [8, 60.2, 60],
    [9, 50, 50.2],
  ];

  it('come from builds judged one after another and from all judged at once', () => {
    for (const [n, ...levelsDbuv] of HISTORY) bench.measureAndJudge(n, ...levelsDbuv);
    const other = openBench();
    for (const [n, ...levelsDbuv] of HISTORY) other.measure(n, ...levelsDbuv);
    other.judge();
    expect(bench.drops()).toEqual(['3 new', '7 new']);
    expect(bench.history(1).slice(0, 3)).toEqual([
      'Still there in C1 / 1.4: -6.3 dB, 9.1 dB left to the limit.',
      'No longer seen in C1 / 1.5: -0.2 dB, 15.2 dB left to the limit.',
      'There again in C1 / 1.6: -6.0 dB, 9.4 dB left to the limit.',
    ]);
    expect(bench.history(2)[0]).toBe('Still there in C1 / 1.8: -10.1 dB, 5.3 dB left to the limit.');
    expect(other.told()).toEqual(bench.told());
  });

  it.each([
    ['oldest first', (ids: number[]) => ids],
    ['newest first', (ids: number[]) => [...ids].reverse()],
    ['mixed', (ids: number[]) => [ids[4], ids[7], ids[2], ids[0], ids[8], ids[5], ids[1], ids[6], ids[3]]],
  ])('stand when everything is judged again, %s', (_name, inOrder) => {
    for (const [n, ...levelsDbuv] of HISTORY) bench.measureAndJudge(n, ...levelsDbuv);
    const before = bench.stored();
    bench.context.clock.advance(3600_000);
    markStale(bench.context, bench.laboratory.product.id, 1);
    const ids = bench.context.db.select().from(builds).orderBy(asc(builds.position)).all();
    for (const id of inOrder(ids.map((build) => build.id))) judgeOneBuild(bench.context, id);
    bench.judge();
    expect(bench.stored()).toEqual(before);
  });
});

describe('a new drop is raised', () => {
  it('when a build lost further, and later builds go on with that one', () => {
    bench.measureAndJudge(3, 56.1, 55.9);
    bench.measureAndJudge(4, 59.9, 60.1);
    bench.measureAndJudge(5, 60.2, 60);
    expect(bench.drops()).toEqual(['3 new', '4 new']);
    expect(bench.history(1)).toEqual([]);
    expect(bench.history(2)).toEqual(['Still there in C1 / 1.5: -10.1 dB, 5.3 dB left to the limit.']);
  });

  it('once a loss that creeps on has grown by the threshold since it was raised', () => {
    bench.measureAndJudge(3, 56, 56.1, 55.9);
    bench.measureAndJudge(4, 57.2, 57.3, 57.1);
    bench.measureAndJudge(5, 58.4, 58.5, 58.3);
    expect(bench.drops()).toEqual(['3 new', '5 new']);
  });

  it('when another harmonic than the known one sticks out further', () => {
    const switching = [{ stage: 'PFC', frequencyHz: 79_500, spreadPercent: 0 }];
    const measure = (n: number, frequencyHz: number, levelsDbuv: number[]) =>
      levelsDbuv.forEach((levelDbuv, index) =>
        measureBuild(bench.context, bench.laboratory, n, {
          levelsDbuv: [levelDbuv],
          takenAt: dayOf(n) + index * 3600_000,
          tags: { switching },
          shape: { peaks: [[frequencyHz, levelDbuv]] },
        }),
      );
    measure(3, 159_000, [56, 56.1, 55.9]);
    measure(4, 159_000, [56.4, 56.5, 56.3]);
    // The limit is 62.1 dBuV at 240 kHz: 1 dB less margin than before, half of the threshold.
    measure(5, 240_000, [53.6, 53.7, 53.5]);
    bench.judge();
    expect(bench.drops()).toEqual(['3 new', '5 new']);
    expect([1, 2].map((id) => bench.dropRow(id).evidence.harmonic?.order)).toEqual([2, 3]);
    expect(bench.history(1)).toHaveLength(1);
  });

  it('when the drop was fixed in between by an earlier build', () => {
    bench.measureAndJudge(3, 56.1, 55.9);
    bench.measureAndJudge(4, 50.1, 50.2);
    moveDrop(bench.context, bench.engineer, 1, { state: 'fixed', note: '', fixedByBuildId: bench.idOf(4) });
    bench.measureAndJudge(5, 56.2, 56);
    expect(bench.drops()).toEqual(['3 fixed', '5 new']);
  });

  it('not for a build from before the fix that was measured late', () => {
    bench.measureAndJudge(3, 56.1, 55.9);
    bench.measureAndJudge(5, 50.1, 50.2);
    moveDrop(bench.context, bench.engineer, 1, { state: 'fixed', note: '', fixedByBuildId: bench.idOf(5) });
    bench.measureAndJudge(4, 56.2, 56);
    expect(bench.drops()).toEqual(['3 fixed']);
    expect(bench.history(1).at(-1)).toBe('Still there in C1 / 1.4: -6.1 dB, 9.3 dB left to the limit.');
  });
});

describe('an accepted drop', () => {
  beforeEach(() => {
    bench.measureAndJudge(3, 56.1, 55.9);
    moveDrop(bench.context, bench.engineer, 1, { state: 'accepted', note: 'ships so' });
  });

  it('carries on without being brought up again', () => {
    const { updatedAt } = bench.dropRow(1);
    bench.context.clock.advance(1000);
    bench.measureAndJudge(4, 56.3, 56.1);
    expect(bench.drops()).toEqual(['3 accepted']);
    expect(bench.dropRow(1).updatedAt).toBe(updatedAt);
    expect(bench.history(1).at(-1)).toBe('Still there in C1 / 1.4: -6.2 dB, 9.2 dB left to the limit.');
  });

  it('does not cover a loss that grew by the threshold', () => {
    bench.measureAndJudge(4, 59.9, 60.1);
    expect(bench.drops()).toEqual(['3 accepted', '4 new']);
  });
});

describe('a build with the margin back', () => {
  beforeEach(() => {
    bench.measureAndJudge(3, 56.1, 55.9);
    bench.measureAndJudge(4, 56.3, 56.1);
  });

  it('is told once, and moves no state', () => {
    bench.measureAndJudge(5, 50.1, 50.3);
    bench.measureAndJudge(6, 50, 50.2);
    expect(bench.drops()).toEqual(['3 new']);
    expect(bench.history(1).slice(1)).toEqual(['No longer seen in C1 / 1.5: -0.2 dB, 15.2 dB left to the limit.']);
  });

  it('is not one that only holds the lower margin against a reference that has the loss too', () => {
    const found = findProduct(
      bench.context,
      bench.engineer,
      bench.laboratory.product.key,
      undefined,
      'references.choose',
    );
    chooseReference(bench.context, bench.engineer, found, { buildId: bench.idOf(4), reason: 'new release' });
    bench.measureAndJudge(5, 56.2, 56.1);
    expect(
      bench.context.db
        .select()
        .from(builds)
        .where(eq(builds.id, bench.idOf(5)))
        .get()?.verdict,
    ).not.toBe('lost');
    expect(bench.history(1)).toHaveLength(1);
  });

  it('takes its word back when it no longer shows it', () => {
    bench.measureAndJudge(5, 50.1, 50.3);
    bench.measureAndJudge(5, 53.8, 54, 54.1, 53.9);
    expect(bench.history(1).at(-1)).toMatch(
      /^C1 \/ 1\.5 no longer shows the margin back: L QP |^Still there in C1 \/ 1\.5: /,
    );
    expect(bench.history(1)).toHaveLength(3);
  });
});

describe('a build that is measured late', () => {
  it('leaves the drop where it is, though it had the loss already', () => {
    bench.measureAndJudge(4, 56.1, 55.9);
    bench.measureAndJudge(3, 56.2, 56);
    expect(bench.drops()).toEqual(['4 new']);
    expect(bench.history(1)[0]).toBe('Already there in C1 / 1.3: -6.1 dB, 9.3 dB left to the limit.');
    const before = bench.stored();
    markStale(bench.context, bench.laboratory.product.id, 1);
    bench.judge();
    expect(bench.stored()).toEqual(before);
  });

  it('has a drop of its own when the later one lost further', () => {
    bench.measureAndJudge(4, 60.1, 59.9);
    bench.measureAndJudge(3, 56.2, 56);
    expect(bench.drops()).toEqual(['4 new', '3 new']);
  });
});

describe('a drop whose own build no longer shows it', () => {
  it('is withdrawn, and the build after it raises the loss for itself', () => {
    bench.measureAndJudge(3, 56.1, 55.9);
    bench.measureAndJudge(4, 56.3, 56.1);
    const contradicting = bench.measureAndJudge(3, 50, 50.2, 49.9, 50.1, 50.3, 50.1);
    expect(bench.drops()).toEqual(['3 withdrawn', '4 new']);
    expect(bench.stored().sightings).toEqual([]);
    bench.forget(contradicting);
    expect(bench.drops()).toEqual(['3 withdrawn', '4 new']);
    expect(bench.history(2)).toEqual(['Already there in C1 / 1.3: -6.0 dB, 9.4 dB left to the limit.']);
  });

  it('leaves no earlier build without a flag', () => {
    bench.measureAndJudge(4, 56.1, 55.9);
    bench.measureAndJudge(3, 56.2, 56);
    bench.measureAndJudge(4, 50, 50.2, 49.9, 50.1, 50.3, 50.1);
    expect(bench.drops()).toEqual(['4 withdrawn', '3 new']);
  });
});
