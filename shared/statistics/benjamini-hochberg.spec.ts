import { adjustByBenjaminiHochberg } from './benjamini-hochberg';

// Benjamini and Hochberg 1995, section 3.2: 15 hypotheses of the thrombolysis trial.
const TRIAL = [
  0.0001, 0.0004, 0.0019, 0.0095, 0.0201, 0.0278, 0.0298, 0.0344, 0.0459, 0.324, 0.4262, 0.5719, 0.6528, 0.759, 1,
];

describe('adjustByBenjaminiHochberg', () => {
  it('rejects the four hypotheses of the published example at q = 0.05', () => {
    expect(adjustByBenjaminiHochberg(TRIAL).filter((p) => p <= 0.05)).toHaveLength(4);
  });

  it('gives the adjusted values of that example, whatever the order', () => {
    // Computed by hand from the definition, m p / rank with the running minimum.
    const expected = [
      0.0015, 0.003, 0.0095, 0.035625, 0.0603, 0.063857, 0.063857, 0.0645, 0.0765, 0.486, 0.581182, 0.714875, 0.753231,
      0.813214, 1,
    ];
    const reversed = adjustByBenjaminiHochberg([...TRIAL].reverse()).reverse();
    adjustByBenjaminiHochberg(TRIAL).forEach((p, index) => {
      expect(p).toBeCloseTo(expected[index], 6);
      expect(reversed[index]).toBeCloseTo(expected[index], 6);
    });
  });

  it('takes no p values and refuses what is none', () => {
    expect(adjustByBenjaminiHochberg([])).toEqual([]);
    expect(() => adjustByBenjaminiHochberg([1.1])).toThrow(RangeError);
  });
});
