import { fractionAt, frequencyAt, frequencyTicksHz, FULL_RANGE_HZ, tickLabel } from './frequency-scale';

describe('the log frequency axis', () => {
  it('puts the geometric mean in the middle', () => {
    expect(fractionAt(Math.sqrt(150e3 * 30e6), FULL_RANGE_HZ)).toBeCloseTo(0.5, 12);
    expect(frequencyAt(0.5, FULL_RANGE_HZ)).toBeCloseTo(Math.sqrt(150e3 * 30e6), 3);
  });

  it("has the trade's ticks over the full range", () => {
    expect(frequencyTicksHz(FULL_RANGE_HZ).map(tickLabel)).toEqual([
      '150k',
      '200k',
      '300k',
      '500k',
      '1M',
      '2M',
      '3M',
      '5M',
      '10M',
      '20M',
      '30M',
    ]);
  });

  it('falls back to round steps when zoomed in between them', () => {
    expect(frequencyTicksHz({ fromHz: 152e3, toHz: 171e3 }).map(tickLabel)).toEqual(['155k', '160k', '165k', '170k']);
    expect(frequencyTicksHz({ fromHz: 7.2e6, toHz: 7.23e6 }).map(tickLabel)).toContain('7.21M');
  });
});
