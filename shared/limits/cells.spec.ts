import { CELL_COUNT, cellEdgesHz } from './cells';

describe('cellEdgesHz', () => {
  const edgesHz = cellEdgesHz();

  it('reaches from 150 kHz to 30 MHz in 57 cells with edges at 0.5 and 5 MHz', () => {
    expect(edgesHz[0]).toBe(150_000);
    expect(edgesHz.at(-1)).toBe(30_000_000);
    expect(edgesHz).toContain(500_000);
    expect(edgesHz).toContain(5_000_000);
    expect(CELL_COUNT).toBe(57);
    expect(edgesHz).toHaveLength(CELL_COUNT + 1);
  });

  it('rises strictly, in cells between a third and one and a third of 1/24 decade', () => {
    for (let i = 0; i + 1 < edgesHz.length; i++) {
      const width = 24 * Math.log10(edgesHz[i + 1] / edgesHz[i]);
      expect(width).toBeGreaterThan(0.333);
      expect(width).toBeLessThan(1.334);
    }
  });

  it('cannot be changed by a caller for another', () => {
    cellEdgesHz()[0] = 1;
    expect(cellEdgesHz()[0]).toBe(150_000);
  });
});
