import { conformityProbability, uncertaintyAllowanceDb } from './conformity';
import { scallopingBoundDb } from './compare-set-ups';

describe('conformityProbability', () => {
  // Phi(margin / 1.7 dB), JCGM 106 with u = U_cispr / 2; values of the normal distribution table.
  it.each([
    [-2, 0.12],
    [0, 0.5],
    [1, 0.722],
    [2.8, 0.95],
    [5, 0.998],
  ])('at %d dB is %d', (marginDb, expected) => {
    expect(conformityProbability(marginDb, 3.4)).toBeCloseTo(expected, 3);
  });

  it('needs an uncertainty', () => {
    expect(() => conformityProbability(1, 0)).toThrow(RangeError);
  });
});

describe('uncertaintyAllowanceDb', () => {
  it('is what U_lab has above U_cispr, never less than 0 (CISPR 16-4-2)', () => {
    expect(uncertaintyAllowanceDb({ labDb: 4, cisprDb: 3.4 })).toBeCloseTo(0.6, 12);
    expect(uncertaintyAllowanceDb({ labDb: 3, cisprDb: 3.4 })).toBe(0);
  });
});

describe('scallopingBoundDb', () => {
  // Gaussian 6 dB filter of 9 kHz: 6.02 dB at half a bandwidth, computed from the filter shape.
  it.each([
    [9_000, 6.02],
    [4_500, 1.51],
    [2_250, 0.38],
    [1_000, 0.07],
  ])('at %d Hz steps is %d dB', (stepHz, expected) => {
    expect(scallopingBoundDb(stepHz, 9_000)).toBeCloseTo(expected, 2);
  });
});
