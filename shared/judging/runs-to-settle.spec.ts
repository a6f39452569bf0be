import { runsToSettle, type OpenQuestion } from './runs-to-settle';
import { halfWidthDb } from './test-change';

const question = (overrides: Partial<OpenQuestion> = {}): OpenQuestion => ({
  differenceDb: 0,
  thresholdDb: 2,
  spread: { sdDb: 0.7, degreesOfFreedom: 4 },
  buildRuns: 1,
  referenceRuns: 1,
  adjustment: 1,
  ...overrides,
});

describe('halfWidthDb', () => {
  it('is t s sqrt(1 / n + 1 / n): by hand 2.132 * 0.7 * 1.4142 = 2.1105', () => {
    expect(halfWidthDb({ sdDb: 0.7, degreesOfFreedom: 4 }, 1, 1)).toBeCloseTo(2.1105, 3);
  });
});

describe('runsToSettle', () => {
  it('asks for one more run where one fits the interval in: t(0.95, 5) 0.7 sqrt(1.5) = 1.73 dB', () => {
    expect(runsToSettle(question())).toEqual({ buildRuns: 1, referenceRuns: 0 });
  });

  it('asks for runs of the reference too where its single run is what is missing', () => {
    // However many runs of the build: h stays above t(0.95, 16) * 0.7 * sqrt(1 + 1 / 13) = 1.27 dB, 1 dB is left.
    const needed = runsToSettle(question({ differenceDb: 1 }));
    expect(needed?.referenceRuns).toBeGreaterThan(0);
  });

  it('gives the least number: one less does not do', () => {
    const open = question({ differenceDb: 1.2, referenceRuns: 5 });
    const needed = runsToSettle(open);
    const halfWidthWith = (more: number) => halfWidthDb({ sdDb: 0.7, degreesOfFreedom: 4 + more }, 1 + more, 5);
    expect(needed).not.toBeNull();
    expect(1.2 + halfWidthWith(needed?.buildRuns ?? 0)).toBeLessThan(2);
    expect(1.2 + halfWidthWith((needed?.buildRuns ?? 0) - 1)).toBeGreaterThanOrEqual(2);
  });

  it('gives up on a difference that sits on the threshold', () => {
    expect(runsToSettle(question({ differenceDb: 1.99 }))).toBeNull();
  });

  it('counts runs to certainty beyond the threshold, more of them among many bands', () => {
    const alone = runsToSettle(question({ differenceDb: -3, referenceRuns: 5 }));
    const among = runsToSettle(question({ differenceDb: -3, referenceRuns: 5, adjustment: 48 }));
    expect(alone?.buildRuns).toBeLessThan(among?.buildRuns ?? 0);
  });
});
