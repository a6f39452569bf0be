import { theilSenSlope } from './theil-sen';

describe('theilSenSlope', () => {
  it('gives the slope and the 93 % interval of the worked example of Sen 1968 (data from memory)', () => {
    const { slope, interval } = theilSenSlope([1, 2, 3, 4, 10, 12, 18], [9, 15, 19, 20, 45, 55, 78], 0.93);
    expect(slope).toBeCloseTo(4, 12);
    expect(interval[0]).toBeCloseTo(26 / 7, 12);
    expect(interval[1]).toBeCloseTo(35 / 8, 12);
  });

  it('gives the slope and the 95 % interval of the reference page of the R package statpsych, ci.theil', () => {
    const y = [21, 4, 9, 12, 35, 18, 10, 22, 24, 1, 6, 8, 13, 16, 19];
    const x = [67, 28, 30, 28, 52, 40, 25, 37, 44, 10, 14, 20, 28, 40, 51];
    const { slope, interval } = theilSenSlope(x, y, 0.95);
    expect(slope).toBeCloseTo(0.5, 12);
    expect(interval[0]).toBeCloseTo(0.3243243, 6);
    expect(interval[1]).toBeCloseTo(0.75, 6);
  });

  it('leaves the interval open where there are too few points', () => {
    expect(theilSenSlope([1, 2], [1, 2]).interval).toEqual([-Infinity, Infinity]);
  });

  it('refuses a single position', () => {
    expect(() => theilSenSlope([1, 1], [1, 2])).toThrow(RangeError);
  });
});
