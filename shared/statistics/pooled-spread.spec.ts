import { pooledSpread } from './pooled-spread';

// ISO 5725-2, Annex B, determination of the sulfur content of coal, eight laboratories, percent by mass (data from memory;
// the published results below agree with them).
const SULFUR_IN_COAL = [
  {
    level: 1,
    groups: [
      [0.71, 0.71, 0.7, 0.71],
      [0.69, 0.67, 0.68],
      [0.66, 0.65, 0.69],
      [0.67, 0.65, 0.66],
      [0.7, 0.69, 0.66, 0.71, 0.69],
      [0.73, 0.74, 0.73],
      [0.71, 0.71, 0.69],
      [0.7, 0.65, 0.68],
    ],
    published: { mean: 0.69, sr: 0.015, sR: 0.026 },
  },
  {
    level: 4,
    groups: [
      [3.26, 3.26, 3.2, 3.24],
      [3.2, 3.2, 3.2],
      [3.37, 3.36, 3.38],
      [3.16, 3.22, 3.23],
      [3.2, 3.19, 3.18, 3.27, 3.24],
      [3.27, 3.31, 3.29],
      [3.27, 3.24, 3.23],
      [3.25, 3.26, 3.26],
    ],
    published: { mean: 3.25, sr: 0.026, sR: 0.058 },
  },
];

describe('pooledSpread', () => {
  it.each(SULFUR_IN_COAL)(
    'gives the published figures of ISO 5725-2 Annex B, level $level',
    ({ groups, published }) => {
      const spread = pooledSpread(groups);
      expect(spread.grandMean).toBeCloseTo(published.mean, 2);
      expect(spread.withinSd).toBeCloseTo(published.sr, 3);
      expect(spread.reproducibilitySd).toBeCloseTo(published.sR, 3);
      expect(spread.degreesOfFreedom).toBe(19);
    },
  );

  it('knows no spread from single runs', () => {
    expect(pooledSpread([[1], [2]])).toMatchObject({ withinSd: null, degreesOfFreedom: 0, reproducibilitySd: null });
  });

  it('refuses an empty group', () => {
    expect(() => pooledSpread([[1], []])).toThrow(RangeError);
  });
});
