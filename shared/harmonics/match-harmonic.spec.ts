import { matchHarmonics, nameHarmonic } from './match-harmonic';

const PFC = { stage: 'PFC', frequencyHz: 65_000, spreadPercent: 0 };
const LLC = { stage: 'LLC', frequencyHz: 130_000, spreadPercent: 0 };

describe('nameHarmonic', () => {
  it('names the order of the one stage that fits (65 kHz converter: first line in the range is n = 3 at 195 kHz)', () => {
    expect(nameHarmonic(195_400, [PFC], 2_250)).toEqual({
      stage: 'PFC',
      order: 3,
      expectedHz: 195_000,
      offsetHz: 400,
    });
  });

  it('names nothing when two stages fit, and lists both', () => {
    expect(nameHarmonic(260_000, [PFC, LLC], 2_250)).toBeNull();
    expect(matchHarmonics(260_000, [PFC, LLC], 2_250).map(({ stage, order }) => [stage, order])).toEqual([
      ['PFC', 4],
      ['LLC', 2],
    ]);
  });

  it('names nothing when two orders of one stage fit', () => {
    expect(nameHarmonic(205_000, [{ stage: 'drive', frequencyHz: 4_000, spreadPercent: 0 }], 4_500)).toBeNull();
  });

  it('names nothing between two harmonics', () => {
    expect(nameHarmonic(228_000, [PFC], 2_250)).toBeNull();
  });

  it('widens the reach of the n-th harmonic by n times half the excursion', () => {
    // 5 % of 325 kHz is 16.25 kHz in total, 8.125 kHz to each side.
    const spread = { ...PFC, spreadPercent: 5 };
    expect(nameHarmonic(333_000, [spread], 500)?.order).toBe(5);
    expect(nameHarmonic(334_000, [spread], 500)).toBeNull();
  });

  it('does not take the frequency itself for order 0', () => {
    expect(nameHarmonic(1_000, [PFC], 2_000)).toBeNull();
  });

  it('needs a tolerance', () => {
    expect(() => nameHarmonic(195_000, [PFC], 0)).toThrow(RangeError);
  });
});
