import { effectiveDegrees } from './effective-degrees';

describe('effectiveDegrees', () => {
  it('counts copies of one variable once', () => {
    expect(
      effectiveDegrees(
        [
          [1, 1, 1],
          [-2, -2, -2],
          [1, 1, 1],
        ],
        2,
      ),
    ).toBeCloseTo(2, 12);
  });

  it('adds the degrees of freedom of variables of equal variance without common movement', () => {
    // Orthogonal columns of equal norm: S = 4 I, (tr S)^2 / tr(S^2) = 64 / 32 = 2 (by hand).
    expect(
      effectiveDegrees(
        [
          [1, 1],
          [1, -1],
          [-1, 1],
          [-1, -1],
        ],
        3,
      ),
    ).toBeCloseTo(6, 12);
  });

  it('gives unequal variances less than the sum, as Welch and Satterthwaite do', () => {
    // Satterthwaite for variances 1 and 9 with 3 degrees of freedom each: (1 + 9)^2 / (1 / 3 + 81 / 3) = 3.6585.
    expect(
      effectiveDegrees(
        [
          [1, 3],
          [1, -3],
          [-1, 3],
          [-1, -3],
        ],
        3,
      ),
    ).toBeCloseTo(100 / (82 / 3), 10);
  });
});
