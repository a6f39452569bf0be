import { shrinkSpread } from './shrink-spread';

const PRIOR = { sd: 0.7, degreesOfFreedom: 4 };

describe('shrinkSpread', () => {
  it('gives the prior where nothing was measured', () => {
    expect(shrinkSpread({ sd: 0, degreesOfFreedom: 0 }, PRIOR)).toEqual(PRIOR);
  });

  it('weighs both by their degrees of freedom', () => {
    // By hand: (4 * 0.49 + 6 * 0.25) / 10 = 0.346.
    const drawn = shrinkSpread({ sd: 0.5, degreesOfFreedom: 6 }, PRIOR);
    expect(drawn.sd).toBeCloseTo(Math.sqrt(0.346), 12);
    expect(drawn.degreesOfFreedom).toBe(10);
  });

  it('refuses a prior without weight', () => {
    expect(() => shrinkSpread({ sd: 1, degreesOfFreedom: 1 }, { sd: 0.7, degreesOfFreedom: 0 })).toThrow(RangeError);
  });
});
