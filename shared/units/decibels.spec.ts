import { dbmToDbuv, dbmvToDbuv } from './decibels';

describe('level conversions', () => {
  it('puts 0 dBm in 50 ohm at 106.99 dBuV (handbook value 107 dB)', () => {
    expect(dbmToDbuv(0)).toBeCloseTo(106.9897, 4);
  });

  it('agrees with the definition: 1 mW in 50 ohm is sqrt(0.05) V', () => {
    expect(dbmToDbuv(0)).toBeCloseTo(20 * Math.log10(Math.sqrt(1e-3 * 50) / 1e-6), 10);
  });

  it('puts 0 dBmV at 60 dBuV, by definition', () => {
    expect(dbmvToDbuv(0)).toBe(60);
    expect(dbmvToDbuv(-14.5)).toBe(45.5);
  });
});
