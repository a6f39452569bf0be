/** Mark of a cell without a measured point, in vectors of centi-dB held as Int16. */
export const CELL_NOT_MEASURED = -32768;

const CELLS_PER_DECADE = 24;
/** Range of conducted emission in CISPR 32 and its sister standards, with the breaks of their mains-port limits. */
const BREAKS_HZ = [150_000, 500_000, 5_000_000, 30_000_000];

function buildCellEdgesHz(): Float64Array {
  const first = BREAKS_HZ[0];
  const last = BREAKS_HZ[BREAKS_HZ.length - 1];
  const edgesHz = [...BREAKS_HZ];
  for (let k = 1; ; k++) {
    const edgeHz = Math.round(first * 10 ** (k / CELLS_PER_DECADE));
    if (edgeHz >= last) break;
    const nearBreak = BREAKS_HZ.some((breakHz) => Math.abs(Math.log10(edgeHz / breakHz)) * CELLS_PER_DECADE < 1 / 3);
    if (!nearBreak) edgesHz.push(edgeHz);
  }
  return Float64Array.from(edgesHz.sort((a, b) => a - b));
}

const CELL_EDGES_HZ = buildCellEdgesHz();

/** Cells of every margin vector. */
export const CELL_COUNT = CELL_EDGES_HZ.length - 1;

/**
 * Edges of the cells of the margin map, one grid for all products so that stored vectors stay comparable.
 * Formula: 150 kHz * 10^(k/24) to whole Hz, plus 0.5, 5 and 30 MHz; an edge closer than a third of a cell to one of
 * those is left out.
 * @returns edges in Hz, strictly rising; cell i reaches from edge i to edge i+1, both included. A fresh copy.
 * Source: our own definition; 24 a decade is 10 % a cell, a few points of a 4.5 kHz grid even at 150 kHz.
 * Example: 58 edges, 57 cells, the first from 150000 to 165104 Hz.
 */
export function cellEdgesHz(): Float64Array {
  return CELL_EDGES_HZ.slice();
}
