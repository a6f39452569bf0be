import { trapezoidHarmonic } from './trapezoid';

function harmonic(frequencyHz: number, duty: number, edgeS: number, order: number): number {
  const edge = edgeS * frequencyHz;
  return trapezoidHarmonic({ amplitude: 400, duty, riseFraction: edge, fallFraction: edge }, order);
}

describe('trapezoidHarmonic', () => {
  // Source: C. R. Paul, Introduction to Electromagnetic Compatibility, 2nd ed., 3.2; values computed from 2 A d sinc sinc.
  it.each([
    [1, 254.637],
    [3, 84.851],
    [5, 50.877],
    [11, 23.035],
    [51, 4.4759],
    [2, 0],
  ])('gives harmonic %d of 400 V, 100 kHz, d 0.5, 50 ns as %d V', (order, expectedV) => {
    expect(harmonic(100e3, 0.5, 50e-9, order)).toBeCloseTo(expectedV, 3);
  });

  it.each([
    [1, 206.013],
    [2, 121.089],
    [3, 26.229],
    [5, 50.922],
    [51, 3.9741],
  ])('gives harmonic %d of 400 V, 65 kHz, d 0.3, 30 ns as %d V', (order, expectedV) => {
    expect(harmonic(65e3, 0.3, 30e-9, order)).toBeCloseTo(expectedV, 3);
  });

  // Source: envelope above the second corner is inverse to the edge (Paul 3.2): half the rise time, 6.0 dB more.
  it('rises by 6 dB above the second corner when the edge is half as long', () => {
    const power = (edgeS: number): number =>
      Array.from({ length: 1000 }, (_, index) => harmonic(100e3, 0.47, edgeS, 1000 + index) ** 2).reduce(
        (a, b) => a + b,
      );
    expect(Math.abs(10 * Math.log10(power(50e-9) / power(100e-9)) - 6)).toBeLessThan(0.2);
  });

  it('lets the faster edge set the level at high frequency', () => {
    const wave = { amplitude: 400, duty: 0.4, riseFraction: 0.002, fallFraction: 0.02 };
    const slow = { ...wave, riseFraction: 0.02 };
    expect(trapezoidHarmonic(wave, 177)).toBeGreaterThan(2 * trapezoidHarmonic(slow, 177));
  });
});
