import { CELL_NOT_MEASURED } from '../limits/cells';
import { meanCells } from './mean-cells';

describe('meanCells', () => {
  it('averages cell by cell and leaves out a cell that one vector did not measure', () => {
    const means = meanCells([Int16Array.of(100, 250, -31), Int16Array.of(200, CELL_NOT_MEASURED, -30)]);
    expect([...means]).toEqual([150, CELL_NOT_MEASURED, -30]);
  });

  it('refuses vectors of unlike length, and none', () => {
    expect(() => meanCells([Int16Array.of(1), Int16Array.of(1, 2)])).toThrow(RangeError);
    expect(() => meanCells([])).toThrow(RangeError);
  });
});
