import { aBand, runsOf } from '../../test/builders/judging';
import { estimateSpreads } from './estimate-spreads';
import type { RunMargin } from './run-margin';

const LIMIT = 'CISPR32_B/QP';

/** A band without a build of its own, so that only the earlier runs tell its spread. */
const bandWith = (history: readonly RunMargin[]) => ({
  band: aBand({ build: [], reference: history, history }),
  limitLineKey: LIMIT,
});
const measuredAs = (marginsDb: readonly number[]) =>
  bandWith(runsOf(marginsDb).map((run, i) => ({ ...run, run: `${i}` })));

// Deviations +-1 about 8 dB: sum of squares 4, variance 4 / 3 with 3 degrees of freedom.
const FIRST = [9, 7, 9, 7];
const SECOND = [9, 9, 7, 7];

describe('estimateSpreads', () => {
  it('gives the planning value where no run was repeated', () => {
    expect(estimateSpreads([measuredAs([8])])[0]).toMatchObject({ sdDb: 0.7, degreesOfFreedom: 4, source: 'planning' });
  });

  it('counts bands that move together once: 4 + 3 degrees of freedom for six copies', () => {
    const [spread] = estimateSpreads(Array.from({ length: 6 }, () => measuredAs(FIRST)));
    expect(spread.degreesOfFreedom).toBeCloseTo(4 + 3, 10);
    // By hand: (4 * 0.49 + 3 * 4 / 3) / 7 = 0.85143.
    expect(spread.sdDb).toBeCloseTo(Math.sqrt(0.85143), 4);
  });

  it('counts bands that move apart for more: two independent patterns give 4 + 6', () => {
    const bands = [FIRST, SECOND, FIRST, SECOND, FIRST, SECOND].map(measuredAs);
    expect(estimateSpreads(bands)[0].degreesOfFreedom).toBeCloseTo(4 + 6, 10);
  });

  it('does not lend the spread of quiet bands to a noisy one', () => {
    const quiet = Array.from({ length: 8 }, () => measuredAs([8.1, 7.9, 8.1, 7.9, 8.1, 7.9, 8.1, 7.9]));
    const noisy = measuredAs([10, 6, 10, 6, 10, 6, 10, 6]);
    const spreads = estimateSpreads([...quiet, noisy]);
    expect(spreads[8].sdDb).toBeGreaterThan(2 * spreads[0].sdDb);
  });

  it('keeps benches apart: the offset between two is not spread', () => {
    const here = runsOf([8.5, 7.5, 8.5, 7.5], 1, { bench: 'bench-1' });
    const there = runsOf([11.5, 10.5, 11.5, 10.5], 5, { bench: 'bench-2' });
    // By hand: sum of squares 2 with 6 degrees of freedom; (4 * 0.49 + 2) / 10 = 0.396.
    expect(estimateSpreads([bandWith([...here, ...there])])[0].sdDb).toBeCloseTo(Math.sqrt(0.396), 10);
  });

  it('leaves out sweeps that could not be compared', () => {
    const sound = runsOf([8.5, 7.5]);
    const wrong = runsOf([18], 3, { rbwHz: 120_000 });
    expect(estimateSpreads([bandWith([...sound, ...wrong])])).toEqual(estimateSpreads([bandWith(sound)]));
  });
});
