import type { BuildRange } from './build-range';

/** Margins of a map as drawn: one column a build, or fewer when builds are narrower than a pixel. */
export interface MarginGrid {
  columns: number;
  rows: number;
  /** Column by column from the lowest cell up, dB; NaN where nothing was measured. */
  marginsDb: Float32Array;
}

/** Builds [from, to) that stand in a column of the picture. */
export function columnBuilds(column: number, columns: number, { from, to }: BuildRange): BuildRange {
  const count = to - from;
  return {
    from: from + Math.floor((column * count) / columns),
    to: from + Math.floor(((column + 1) * count) / columns),
  };
}

/** Columns that a plot of a width can show without merging more builds than it must. */
export function columnCount({ from, to }: BuildRange, widthPx: number): number {
  return Math.max(1, Math.min(to - from, Math.floor(widthPx)));
}

/**
 * Lays the builds in view out in columns. Where several builds share one, each cell keeps the worst margin, never the
 * mean, so that a dip of a single build is seen at any width.
 * @param cells one row of margins a build, dB, null where not measured
 */
export function marginGrid(
  cells: readonly (readonly (number | null)[])[],
  range: BuildRange,
  columns: number,
): MarginGrid {
  const rows = cells[0]?.length ?? 0;
  const marginsDb = new Float32Array(columns * rows).fill(NaN);
  for (let column = 0; column < columns; column++) {
    const { from, to } = columnBuilds(column, columns, range);
    for (let build = from; build < to; build++) {
      for (let row = 0; row < rows; row++) {
        const marginDb = cells[build][row];
        const at = column * rows + row;
        if (marginDb !== null && !(marginsDb[at] <= marginDb)) marginsDb[at] = marginDb;
      }
    }
  }
  return { columns, rows, marginsDb };
}
