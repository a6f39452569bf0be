import { spreadShape } from './spread-line';

const decibels = (ratio: number): number => 20 * Math.log10(ratio);

describe('spreadShape', () => {
  // Source: own simulation of a Gaussian 9 kHz receiver with CISPR 16-1-1 detectors over all tunings, in dB against the line without
  // modulation (PK / QP / AV); the slow limit of AV is 20 lg(B_imp / excursion). Published reports of 5-10 dB agree in size.
  it.each([
    ['triangle', 10e3, 400, 0, -0.5, -2.2],
    ['triangle', 40e3, 400, -0.1, -1.3, -12.2],
    ['triangle', 100e3, 400, -0.3, -2.3, -19.1],
    ['triangle', 40e3, 2000, -1, -2, -9.3],
    ['triangle', 40e3, 9000, -4, -4.4, -4.6],
    ['triangle', 100e3, 9000, -7.4, -7.8, -8],
    ['triangle', 100e3, 20000, -4.6, -4.6, -4.6],
    ['sine', 40e3, 400, 0, -0.8, -11.4],
    ['sine', 100e3, 2000, -1.6, -2.8, -12.5],
  ] as const)('lowers a line by %s %d Hz at %d Hz as expected', (profile, excursionHz, modulationHz, pk, qp, av) => {
    const { readings } = spreadShape(excursionHz, modulationHz, profile);
    const highest = (of: 'peak' | 'quasiPeak' | 'average'): number => decibels(Math.max(...readings.map((r) => r[of])));
    expect(Math.abs(highest('peak') - pk)).toBeLessThan(0.35);
    expect(Math.abs(highest('quasiPeak') - qp)).toBeLessThan(0.35);
    expect(Math.abs(highest('average') - av)).toBeLessThan(0.7);
  });

  // Source: a frequency that sweeps evenly spends B_imp / excursion of the time in the filter: -12.4 dB at 40 kHz.
  it('has a flat average plateau and falls off beyond the edge', () => {
    const { offsetsHz, readings } = spreadShape(40e3, 400, 'triangle');
    expect(decibels(readings[0].average)).toBeCloseTo(-12.4, 0);
    const outside = readings[offsetsHz.findIndex((offsetHz) => offsetHz > 34e3)];
    expect(decibels(outside.peak)).toBeLessThan(-40);
  });
});
