import fc from 'fast-check';
import { interpolatePeak } from './interpolate-peak';

/** What a Gaussian receiver filter of 9 kHz at -6 dB shows of a steady line: 24.0824 dB (offset / bandwidth)^2 below it. */
function gaussianLine(frequenciesHz: Float64Array, lineHz: number, levelDbuv: number): Float32Array {
  return Float32Array.from(frequenciesHz, (hz) => levelDbuv - 24.0824 * ((hz - lineHz) / 9000) ** 2);
}

const gridHz = Float64Array.from({ length: 9 }, (_, i) => 1_000_000 + 4500 * i);

describe('interpolatePeak', () => {
  it('gives the worked example', () => {
    const peak = interpolatePeak(Float64Array.of(1_000_000, 1_004_500, 1_009_000), Float32Array.of(40, 46, 44), 1);
    expect(peak?.frequencyHz).toBeCloseTo(1_005_625, 3);
    expect(peak?.levelDbuv).toBeCloseTo(46.25, 5);
  });

  // A Gaussian is a parabola on a dB scale, so three points of it determine its top.
  it('finds place and level of a line behind a Gaussian filter, wherever it lies between the points', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -0.49, max: 0.49, noNaN: true }),
        fc.double({ min: 20, max: 100, noNaN: true }),
        (share, levelDbuv) => {
          const lineHz = gridHz[4] + share * 4500;
          const peak = interpolatePeak(gridHz, gaussianLine(gridHz, lineHz, levelDbuv), 4);
          expect(Math.abs((peak?.frequencyHz ?? 0) - lineHz)).toBeLessThan(0.5);
          expect(peak?.levelDbuv).toBeCloseTo(levelDbuv, 4);
        },
      ),
    );
  });

  // Scalloping of a 9 kHz Gaussian filter on a 4.5 kHz grid, worst case: 24.0824 * (2.25 / 9)^2 = 1.51 dB.
  it('gains back the 1.51 dB that a line midway between two points loses', () => {
    const lineHz = gridHz[4] + 2249;
    const levels = gaussianLine(gridHz, lineHz, 60);
    expect(60 - levels[4]).toBeCloseTo(1.5, 1);
    expect(interpolatePeak(gridHz, levels, 4)?.levelDbuv).toBeCloseTo(60, 4);
  });

  it('is exact on uneven steps', () => {
    const unevenHz = Float64Array.of(1_000_000, 1_003_000, 1_008_000);
    const peak = interpolatePeak(unevenHz, gaussianLine(unevenHz, 1_004_000, 60), 1);
    expect(peak?.frequencyHz).toBeCloseTo(1_004_000, 0);
    expect(peak?.levelDbuv).toBeCloseTo(60, 4);
  });

  it.each([
    ['a slope', [1, 2, 3], 1],
    ['a slope that flattens', [1, 3, 4], 1],
    ['a dip', [3, 1, 3], 1],
    ['a plateau', [2, 2, 2], 1],
    ['the first point', [3, 2, 1], 0],
    ['the last point', [1, 2, 3], 2],
  ])('leaves %s alone', (_name, levels, index) => {
    expect(interpolatePeak(Float64Array.of(1, 2, 3), Float32Array.from(levels), index)).toBeNull();
  });

  it('never moves more than half a step and never lowers the level, whatever the noise', () => {
    const level = fc.float({ min: -20, max: 120, noNaN: true });
    const step = fc.double({ min: 1, max: 1e5, noNaN: true });
    fc.assert(
      fc.property(level, level, level, step, step, (below, at, above, stepBelowHz, stepAboveHz) => {
        const centreHz = 1e6;
        const hz = Float64Array.of(centreHz - stepBelowHz, centreHz, centreHz + stepAboveHz);
        const peak = interpolatePeak(hz, Float32Array.of(below, at, above), 1);
        if (peak === null) return;
        expect(peak.frequencyHz).toBeGreaterThanOrEqual(centreHz - stepBelowHz / 2 - 1e-6);
        expect(peak.frequencyHz).toBeLessThanOrEqual(centreHz + stepAboveHz / 2 + 1e-6);
        expect(peak.levelDbuv).toBeGreaterThanOrEqual(Math.fround(at) - 1e-6);
      }),
    );
  });
});
