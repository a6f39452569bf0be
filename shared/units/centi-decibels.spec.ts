import fc from 'fast-check';
import { centiDbToDb, marginToCentiDb } from './centi-decibels';

describe('marginToCentiDb', () => {
  it.each([
    [3.219, 321],
    [-0.001, -1],
    [-2.005, -201],
    [0, 0],
    [0.29, 29],
    [400, 32767],
    [-400, -32767],
  ])('stores %d dB as %d', (marginDb, centiDb) => {
    expect(marginToCentiDb(marginDb)).toBe(centiDb);
  });

  it('never overstates a margin, and understates it by less than 0.01 dB', () => {
    fc.assert(
      fc.property(fc.double({ min: -300, max: 300, noNaN: true }), (marginDb) => {
        const storedDb = centiDbToDb(marginToCentiDb(marginDb));
        expect(storedDb).toBeLessThanOrEqual(marginDb);
        expect(marginDb - storedDb).toBeLessThan(0.01 + 1e-9);
      }),
    );
  });

  it('gives a margin of two decimals back as it was', () => {
    fc.assert(
      fc.property(fc.integer({ min: -32767, max: 32767 }), (centiDb) => {
        expect(marginToCentiDb(centiDb / 100)).toBe(centiDb);
      }),
    );
  });
});
