import { trendGaps } from './trend-gaps';
import { worstMarginDb } from './worst-margin';

const trend = (...marginsDb: (number | null)[]) =>
  marginsDb.map((worstMarginDb, i) => ({ buildId: i + 1, worstMarginDb }));

describe('trendGaps', () => {
  it('names the stretch, its measured neighbours and the build that halves the search', () => {
    expect(trendGaps(trend(8, null, null, null, 3, 3, null))).toEqual([
      { buildIds: [2, 3, 4], before: 1, after: 5, halvingBuildId: 3 },
      { buildIds: [7], before: 6, after: null, halvingBuildId: 7 },
    ]);
  });

  it('has none in a full trend, and no neighbours where nothing was measured', () => {
    expect(trendGaps(trend(8, 7))).toEqual([]);
    expect(trendGaps(trend(null, null))).toEqual([{ buildIds: [1, 2], before: null, after: null, halvingBuildId: 1 }]);
  });
});

describe('worstMarginDb', () => {
  it('passes over what was not measured and never takes it for a margin', () => {
    expect(worstMarginDb([4.2, null, 6.1])).toBe(4.2);
    expect(worstMarginDb([null])).toBeNull();
  });
});
