import { inferFrequencyUnit } from './infer-frequency-unit';

describe('inferFrequencyUnit', () => {
  it.each([
    [0.15, 30, 'MHz'],
    [150, 30_000, 'kHz'],
    [150_000, 30_000_000, 'Hz'],
    [9_000, 150_000, undefined],
    [0.15, 0.5, undefined],
    [30, 1000, undefined],
    [0.009, 30, 'MHz'],
    [1, 1e12, undefined],
  ])('takes %d to %d for %s', (first, last, unit) => {
    expect(inferFrequencyUnit(first, last)).toBe(unit);
  });
});
