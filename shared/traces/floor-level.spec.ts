import fc from 'fast-check';
import { floorLevel } from './floor-level';

describe('floorLevel', () => {
  it('is the level that a fifth of the points do not exceed', () => {
    const levels = Float32Array.from({ length: 100 }, (_, i) => (i < 20 ? 10 : 50));
    expect(floorLevel(levels, 0, 100)).toBeCloseTo(10.05, 6);
    expect(floorLevel(levels, 1, 100)).toBeCloseTo(50.05, 6);
  });

  it('looks at the given stretch only, and at none when it is empty', () => {
    const levels = Float32Array.of(0, 30, 30, 30, 0);
    expect(floorLevel(levels, 1, 4)).toBeCloseTo(30.05, 6);
    expect(floorLevel(levels, 2, 2)).toBeNull();
  });

  it('agrees with the sorted levels to half a bin', () => {
    const levelsOf = fc.array(fc.float({ min: -90, max: 190, noNaN: true }), { minLength: 1, maxLength: 200 });
    fc.assert(
      fc.property(levelsOf, (numbers) => {
        const levels = Float32Array.from(numbers);
        const sorted = levels.slice().sort();
        const exact = sorted[Math.ceil(levels.length * 0.2) - 1];
        expect(Math.abs((floorLevel(levels, 0, levels.length) ?? Infinity) - exact)).toBeLessThanOrEqual(0.0501);
      }),
    );
  });
});
