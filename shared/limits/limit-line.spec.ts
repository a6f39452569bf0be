import fc from 'fast-check';
import type { LimitLine } from './limit-line';
import { limitAt } from './limit-line';
import { CISPR32_A, CISPR32_B } from './tables/cispr-32';

function lineOf(set: typeof CISPR32_B, detector: string): LimitLine {
  const line = set.lines.find((one) => one.detector === detector);
  if (line === undefined) throw new RangeError(`${set.key} has no ${detector} line`);
  return line;
}

const classB = lineOf(CISPR32_B, 'QP');
const classA = lineOf(CISPR32_A, 'QP');

describe('limitAt', () => {
  // Source: corner values CISPR 32 Tables A.9 and A.10 (the same in 47 CFR 15.107); between them calculated by hand from
  // L = L1 + (L2 - L1) log10(f/f1) / log10(f2/f1), for example 66 - 10 * log10(2) / log10(10/3) = 60.243 at 300 kHz.
  it.each([
    ['class B QP', classB, 150_000, 66],
    ['class B QP', classB, 200_000, 63.611],
    ['class B QP', classB, 250_000, 61.757],
    ['class B QP', classB, 300_000, 60.243],
    ['class B QP', classB, 400_000, 57.853],
    ['class B QP', classB, 273_861.28, 61],
    ['class B QP', classB, 500_000, 56],
    ['class B QP', classB, 5_000_001, 60],
    ['class B QP', classB, 30_000_000, 60],
    ['class B AV', lineOf(CISPR32_B, 'AV'), 150_000, 56],
    ['class B AV', lineOf(CISPR32_B, 'AV'), 300_000, 50.243],
    ['class B AV', lineOf(CISPR32_B, 'AV'), 1_000_000, 46],
    ['class B AV', lineOf(CISPR32_B, 'AV'), 10_000_000, 50],
    ['class A QP', classA, 150_000, 79],
    ['class A QP', classA, 499_999, 79],
    ['class A QP', classA, 30_000_000, 73],
    ['class A AV', lineOf(CISPR32_A, 'AV'), 499_999, 66],
    ['class A AV', lineOf(CISPR32_A, 'AV'), 10_000_000, 60],
  ])('sets the limit of %s at %#', (_name, line, frequencyHz, limitDbuv) => {
    expect(limitAt(line, frequencyHz)).toBeCloseTo(limitDbuv, 3);
  });

  // Source: CISPR 32 and 47 CFR 15.107, the lower limit applies at the edge between two ranges.
  it('applies the lower of two limits at a shared edge, exactly', () => {
    expect(limitAt(classB, 5_000_000)).toBe(56);
    expect(limitAt(classA, 500_000)).toBe(73);
    expect(limitAt(lineOf(CISPR32_A, 'AV'), 500_000)).toBe(60);
  });

  it.each([149_999, 30_000_001])('sets no limit at %d Hz, outside all segments', (frequencyHz) => {
    expect(limitAt(classB, frequencyHz)).toBeNull();
  });

  it('sets no limit in a gap between segments', () => {
    const gapped: LimitLine = {
      detector: 'QP',
      segments: [
        { fromHz: 100, toHz: 200, fromDbuv: 50, toDbuv: 50 },
        { fromHz: 300, toHz: 400, fromDbuv: 50, toDbuv: 50 },
      ],
    };
    expect(limitAt(gapped, 250)).toBeNull();
  });

  it('stays between the ends of a segment and is the mean at their geometric mean', () => {
    const level = fc.double({ min: -50, max: 150, noNaN: true });
    const start = fc.double({ min: 1e3, max: 1e7, noNaN: true });
    const ratio = fc.double({ min: 1.01, max: 1e3, noNaN: true });
    const share = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(level, level, start, ratio, share, (fromDbuv, toDbuv, fromHz, width, at) => {
        const toHz = fromHz * width;
        const line: LimitLine = { detector: 'QP', segments: [{ fromHz, toHz, fromDbuv, toDbuv }] };
        const limitDbuv = limitAt(line, Math.min(toHz, fromHz * width ** at));
        expect(limitDbuv).toBeGreaterThanOrEqual(Math.min(fromDbuv, toDbuv) - 1e-9);
        expect(limitDbuv).toBeLessThanOrEqual(Math.max(fromDbuv, toDbuv) + 1e-9);
        expect(limitAt(line, Math.sqrt(fromHz * toHz))).toBeCloseTo((fromDbuv + toDbuv) / 2, 6);
        expect(limitAt(line, fromHz)).toBe(fromDbuv);
        expect(limitAt(line, toHz)).toBe(toDbuv);
      }),
    );
  });
});
