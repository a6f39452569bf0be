import { columnBuilds, columnCount, marginGrid } from './margin-grid';

describe('marginGrid', () => {
  it('keeps one column a build while builds are wider than a pixel', () => {
    const grid = marginGrid(
      [
        [1, 2],
        [null, 4],
      ],
      { from: 0, to: 2 },
      2,
    );
    expect([...grid.marginsDb]).toEqual([1, 2, NaN, 4]);
  });

  it('keeps the worst margin, not the mean, where builds share a column, so that a dip of one build stays', () => {
    const cells = Array.from({ length: 500 }, (_, build) => [build === 123 ? -3 : 20]);
    const grid = marginGrid(cells, { from: 0, to: 500 }, 100);
    expect(grid.columns).toBe(100);
    expect(Math.min(...grid.marginsDb)).toBe(-3);
    expect(grid.marginsDb.filter((marginDb) => marginDb === 20)).toHaveLength(99);
  });

  it('marks a column not measured only when none of its builds was measured', () => {
    expect([...marginGrid([[null], [5], [null], [null]], { from: 0, to: 4 }, 2).marginsDb]).toEqual([5, NaN]);
  });

  it('shares all builds out over the columns without gap or overlap', () => {
    const range = { from: 10, to: 517 };
    const columns = columnCount(range, 300.7);
    expect(columns).toBe(300);
    let next = range.from;
    for (let column = 0; column < columns; column++) {
      const builds = columnBuilds(column, columns, range);
      expect(builds.from).toBe(next);
      next = builds.to;
    }
    expect(next).toBe(range.to);
  });
});
