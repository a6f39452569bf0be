import { tabularCusum } from './cusum';

describe('tabularCusum', () => {
  it('gives the sums of the NIST/SEMATECH e-Handbook, 6.3.2.3', () => {
    const x = [
      324.925, 324.675, 324.725, 324.35, 325.35, 325.225, 324.125, 324.525, 325.225, 324.6, 324.625, 325.15, 328.325,
      327.25, 327.825, 328.5, 326.675, 327.775, 326.875, 328.35,
    ];
    const { upper, lower } = tabularCusum(x, 325, 0.3175);
    const published = [0, 0, 0, 0, 0.03, 0, 0, 0, 0, 0, 0, 0, 3.01, 4.94, 7.45, 10.63, 11.99, 14.44, 16, 19.04];
    const publishedLower = [0, 0.01, 0, 0.33, 0, 0, 0.56, 0.72, 0.17, 0.25, 0.31, ...new Array<number>(9).fill(0)];
    // The handbook prints two decimals, some cut off instead of rounded, so the last digit may differ by one.
    upper.forEach((sum, i) => expect(Math.abs(sum - published[i])).toBeLessThan(0.0101));
    lower.forEach((sum, i) => expect(Math.abs(sum - publishedLower[i])).toBeLessThan(0.0101));
    expect(upper.findIndex((sum) => sum > 4.1959) + 1).toBe(14);
  });

  it('gives the sums of Montgomery, Introduction to Statistical Quality Control, table 9.2', () => {
    const x = [
      9.45, 7.99, 9.29, 11.66, 12.16, 10.18, 8.04, 11.46, 9.2, 10.34, 9.03, 11.47, 10.51, 9.4, 10.08, 9.37, 10.62,
      10.31, 8.52, 10.84, 10.9, 9.33, 12.29, 11.5, 10.6, 11.08, 10.38, 11.62, 11.31, 10.52,
    ];
    const { upper, lower } = tabularCusum(x, 10, 0.5);
    const published = [
      0, 0, 0, 1.16, 2.82, 2.5, 0.04, 1, 0, 0, 0, 0.97, 0.98, 0, 0, 0, 0.12, 0, 0, 0.34, 0.74, 0, 1.79, 2.79, 2.89,
      3.47, 3.35, 4.47, 5.28, 5.3,
    ];
    upper.forEach((sum, i) => expect(sum).toBeCloseTo(published[i], 6));
    expect(lower.slice(0, 7).map((sum) => Number(sum.toFixed(2)))).toEqual([0.05, 1.56, 1.77, 0, 0, 0, 1.46]);
    expect(upper.findIndex((sum) => sum > 5) + 1).toBe(29);
  });

  it('refuses a negative slack', () => {
    expect(() => tabularCusum([1], 0, -1)).toThrow(RangeError);
  });
});
