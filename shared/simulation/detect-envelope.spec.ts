import { detectEnvelope } from './detect-envelope';
import { gaussianResponse } from './receiver-filter';

const decibels = (ratio: number): number => 20 * Math.log10(ratio);

/** Envelope of the Gaussian filter's answer to regular impulses, one period; time course exp(-(pi B6 t)^2 / (4 ln 2)). */
function impulseEnvelope(repetitionHz: number): Float64Array {
  const samples = Math.round(1_000_000 / repetitionHz);
  return Float64Array.from({ length: samples }, (_, index) => {
    const timeS = (index - samples / 2) / 1_000_000;
    return Math.exp(-((Math.PI * 9000 * timeS) ** 2) / (4 * Math.LN2));
  });
}

describe('detectEnvelope', () => {
  it('reads a steady sine the same with every detector', () => {
    expect(detectEnvelope([2, 2, 2])).toEqual({ peak: 2, quasiPeak: 2, average: 2 });
  });

  // Source: own simulation of the CISPR 16-1-1 quasi-peak detector in band B, PK - QP for regular impulses; it reproduces the
  // published pulse response (CISPR 16-1-1, band B) within the published tolerance.
  it.each([
    [1000, 2.1],
    [120, 6.1],
    [100, 6.6],
  ])('reads impulses at %d Hz lower with QP than with PK by %d dB', (repetitionHz, expectedDb) => {
    const { peak, quasiPeak } = detectEnvelope(impulseEnvelope(repetitionHz));
    expect(Math.abs(decibels(peak / quasiPeak) - expectedDb)).toBeLessThan(0.3);
  });

  // Source: PK - AV of a pulse train is 20 lg(B_imp / PRF), CISPR 16-1-1; B_imp = 1.0645 * 9 kHz gives 39.6 dB at 100 Hz.
  it('reads impulses at 100 Hz 39.6 dB lower with AV than with PK', () => {
    const { peak, average } = detectEnvelope(impulseEnvelope(100));
    expect(decibels(peak / average)).toBeCloseTo(39.6, 1);
  });

  it('keeps the order PK >= QP >= AV for any envelope', () => {
    for (const onFraction of [0.02, 0.1, 0.4, 0.9]) {
      const envelope = Float64Array.from({ length: 100 }, (_, i) => (i < 100 * onFraction ? 1 + (i % 3) : 0));
      const { peak, quasiPeak, average } = detectEnvelope(envelope);
      expect(peak).toBeGreaterThanOrEqual(quasiPeak);
      expect(quasiPeak).toBeGreaterThanOrEqual(average);
    }
  });

  it('refuses an empty envelope', () => {
    expect(() => detectEnvelope([])).toThrow(RangeError);
  });
});

describe('gaussianResponse', () => {
  // Source: rejection of a Gaussian filter with 9 kHz at 6 dB, computed from 6.02 dB (2 f / 9 kHz)^2.
  it.each([
    [2000, 1.2],
    [4500, 6.0],
    [5000, 7.4],
    [7500, 16.7],
    [10000, 29.7],
    [15000, 66.9],
  ])('rejects a line %d Hz away by %d dB', (offsetHz, rejectionDb) => {
    expect(-decibels(gaussianResponse(offsetHz))).toBeCloseTo(rejectionDb, 1);
  });

  // Source: worst scalloping loss midway between points of a Gaussian filter, step 4.5 kHz: 1.51 dB.
  it('loses at most 1.51 dB midway between points 4.5 kHz apart', () => {
    expect(-decibels(gaussianResponse(2250))).toBeCloseTo(1.51, 2);
  });
});
