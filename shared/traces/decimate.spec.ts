import fc from 'fast-check';
import { decimate } from './decimate';

const traceOf = (count: number): fc.Arbitrary<[Float64Array, Float32Array]> =>
  fc
    .tuple(
      fc.array(fc.double({ min: 0.001, max: 0.2, noNaN: true }), { minLength: count, maxLength: count }),
      fc.array(fc.float({ min: -20, max: 120, noNaN: true }), { minLength: count, maxLength: count }),
    )
    .map(([growth, levels]) => {
      let hz = 100_000;
      return [Float64Array.from(growth, (share) => (hz *= 1 + share)), Float32Array.from(levels)];
    });

describe('decimate', () => {
  it('keeps the maximum and the minimum of every pixel column', () => {
    const fromHz = 150_000;
    const toHz = 30_000_000;
    const columnOf = (hz: number, columns: number): number =>
      Math.min(columns - 1, Math.floor((columns * Math.log(hz / fromHz)) / Math.log(toHz / fromHz)));
    const extremes = (hz: Float64Array, levels: Float32Array, columns: number): Map<number, [number, number]> => {
      const found = new Map<number, [number, number]>();
      hz.forEach((frequencyHz, i) => {
        if (frequencyHz < fromHz || frequencyHz > toHz) return;
        const column = columnOf(frequencyHz, columns);
        const [low, high] = found.get(column) ?? [Infinity, -Infinity];
        // Adding 0 makes one of the two zeros, which are the same level.
        found.set(column, [Math.min(low, levels[i]) + 0, Math.max(high, levels[i]) + 0]);
      });
      return found;
    };
    fc.assert(
      fc.property(traceOf(300), fc.integer({ min: 1, max: 400 }), ([hz, levels], columns) => {
        const kept = decimate(hz, levels, fromHz, toHz, columns);
        expect(extremes(kept.frequenciesHz, kept.levels, columns)).toEqual(extremes(hz, levels, columns));
        expect(kept.levels.length).toBeLessThanOrEqual(2 * columns + 2);
      }),
      { numRuns: 60 },
    );
  });

  it('keeps only points of the trace, in their order', () => {
    fc.assert(
      fc.property(traceOf(100), ([hz, levels]) => {
        const kept = decimate(hz, levels, 200_000, 1_000_000, 7);
        const levelAt = new Map(Array.from(hz, (frequencyHz, i) => [frequencyHz, levels[i]]));
        kept.frequenciesHz.forEach((frequencyHz, i) => {
          expect(kept.levels[i]).toBe(levelAt.get(frequencyHz));
          if (i > 0) expect(frequencyHz).toBeGreaterThan(kept.frequenciesHz[i - 1]);
        });
      }),
      { numRuns: 50 },
    );
  });

  it('keeps every point where there is room for all, and one beyond each edge', () => {
    const hz = Float64Array.of(100, 200, 300, 400, 500);
    const kept = decimate(hz, Float32Array.of(1, 2, 3, 4, 5), 200, 400, 1000);
    expect([...kept.frequenciesHz]).toEqual([100, 200, 300, 400, 500]);
    expect([...decimate(hz, Float32Array.of(1, 2, 3, 4, 5), 250, 350, 9).frequenciesHz]).toEqual([200, 300, 400]);
  });

  it('draws the line across a range that holds no point', () => {
    const kept = decimate(Float64Array.of(100, 900), Float32Array.of(1, 2), 200, 400, 10);
    expect([...kept.frequenciesHz]).toEqual([100, 900]);
  });

  it('refuses a range that is none', () => {
    expect(() => decimate(Float64Array.of(1), Float32Array.of(1), 0, 10, 5)).toThrow(RangeError);
    expect(() => decimate(Float64Array.of(1), Float32Array.of(1), 10, 10, 5)).toThrow(RangeError);
    expect(() => decimate(Float64Array.of(1), Float32Array.of(1), 1, 10, 0)).toThrow(RangeError);
  });
});
