import { priorDegrees } from './prior-degrees';

const withVariances = (variances: number[], degreesOfFreedom: number) =>
  variances.map((variance) => ({ sd: Math.sqrt(variance), degreesOfFreedom }));

describe('priorDegrees', () => {
  it('finds no difference between equal variances', () => {
    expect(priorDegrees(withVariances([1, 1, 1, 1, 1, 1], 5))).toBe(Infinity);
  });

  it('solves the moment equation of F(10, 12): its variance over its squared mean is 2 (10 + 12 - 2) / (10 * 8) = 0.5', () => {
    // Two values at 1 -+ sqrt(0.5 * 9 / 10), five times each: mean 1, relative variance 0.5 (by hand).
    const away = Math.sqrt(0.45);
    const variances = [1 - away, 1 + away].flatMap((x) => [x, x, x, x, x]);
    expect(priorDegrees(withVariances(variances, 10))).toBeCloseTo(12, 10);
  });

  it('lets a common value weigh little where there are few variances', () => {
    expect(priorDegrees(withVariances([1, 9], 3))).toBe(4);
  });
});
