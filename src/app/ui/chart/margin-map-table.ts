import { formatDecibels } from '@shared/units/format-decibels';
import { AxisBuild, buildLabel } from './build-axis';
import type { BuildRange } from './build-range';
import type { ChartTable } from './chart-table';
import { rangeText } from './frequency-scale';
import { CHIP_LOOKS } from '../chip-looks';

type Cells = readonly (readonly (number | null)[])[];

/** One row a build: its verdict, its worst cell, how many cells are below the target, over the limit, not measured. */
export function marginMapTable(
  builds: readonly AxisBuild[],
  edgesHz: readonly number[],
  cells: Cells,
  targetMarginDb: number,
  { from, to }: BuildRange,
): ChartTable {
  const rows = builds.slice(from, to).map((build, i) => {
    const margins = cells[from + i];
    const worst = worstCell(margins);
    const count = (fits: (marginDb: number | null) => boolean) => String(margins.filter(fits).length);
    return [
      buildLabel(build),
      CHIP_LOOKS[build.verdict ?? 'unjudged'].word,
      worst === null ? 'not measured' : formatDecibels(margins[worst] ?? 0),
      worst === null ? '' : cellText(worst, edgesHz),
      count((marginDb) => marginDb !== null && marginDb < targetMarginDb),
      count((marginDb) => marginDb !== null && marginDb < 0),
      count((marginDb) => marginDb === null),
    ];
  });
  return {
    caption: `Margins of ${rows.length} builds in ${edgesHz.length - 1} cells of frequency`,
    columns: [
      { label: 'Build' },
      { label: 'Verdict' },
      { label: 'Worst margin', isNumber: true },
      { label: 'At', isNumber: true },
      { label: 'Cells below target', isNumber: true },
      { label: 'Cells over limit', isNumber: true },
      { label: 'Cells not measured', isNumber: true },
    ],
    rows,
  };
}

/** The whole matrix: one row a build, one column a cell, margins in dB. */
export function* marginMapCsvRows(
  builds: readonly AxisBuild[],
  edgesHz: readonly number[],
  cells: Cells,
): Generator<(string | number | null)[]> {
  const heads = edgesHz.slice(0, -1).map((edgeHz, cell) => `marginDb ${edgeHz}-${edgesHz[cell + 1]} Hz`);
  yield ['hardware', 'firmware', 'builtAt', 'verdict', ...heads];
  for (const [i, build] of builds.entries()) {
    yield [build.hardware, build.firmware, build.builtAt, build.verdict, ...cells[i]];
  }
}

export function cellText(cell: number, edgesHz: readonly number[]): string {
  return rangeText({ fromHz: edgesHz[cell], toHz: edgesHz[cell + 1] });
}

/** The cell with the least margin, or null when nothing was measured. */
export function worstCell(margins: readonly (number | null)[]): number | null {
  let worst: number | null = null;
  margins.forEach((marginDb, cell) => {
    if (marginDb !== null && (worst === null || marginDb < (margins[worst] ?? Infinity))) worst = cell;
  });
  return worst;
}
