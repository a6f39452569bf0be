import { coveredFraction } from './covered-fraction';

const grid = (fromHz: number, toHz: number, stepHz: number): Float64Array =>
  Float64Array.from({ length: Math.floor((toHz - fromHz) / stepHz) + 1 }, (_, i) => fromHz + stepHz * i);

describe('coveredFraction', () => {
  it('is 1 for a receiver grid over the whole band', () => {
    expect(coveredFraction(grid(150_000, 30_000_000, 4500), 150_000, 500_000)).toBe(1);
    expect(coveredFraction(grid(150_000, 30_000_000, 4500), 5_000_000, 30_000_000)).toBe(1);
  });

  it('is 1 for logarithmic steps of 1 %', () => {
    const logHz = Float64Array.from({ length: 540 }, (_, i) => 150_000 * 1.01 ** i);
    expect(coveredFraction(logHz, 5_000_000, 30_000_000)).toBe(1);
  });

  it('counts what lies before the first and after the last point as not measured', () => {
    expect(coveredFraction(grid(254_500, 404_500, 4500), 150_000, 500_000)).toBeCloseTo((148_500 + 9000) / 350_000, 6);
  });

  it('counts a gap as not measured, but for half a bandwidth at each side', () => {
    const gapped = Float64Array.of(...grid(150_000, 200_000, 5000), ...grid(400_000, 500_000, 5000));
    expect(coveredFraction(gapped, 150_000, 500_000)).toBeCloseTo((350_000 - 200_000 + 9000) / 350_000, 6);
  });

  it('counts single readings with their bandwidth only', () => {
    const readings = grid(160_000, 480_000, 32_000);
    expect(readings).toHaveLength(11);
    expect(coveredFraction(readings, 150_000, 500_000)).toBeCloseTo((11 * 9000) / 350_000, 6);
  });

  it('is 0 for a band without a point near it', () => {
    expect(coveredFraction(grid(1_000_000, 2_000_000, 4500), 150_000, 500_000)).toBe(0);
  });
});
