import type { MarginMapView } from '@shared/contracts/margins';
import { CELL_COUNT, CELL_NOT_MEASURED, cellEdgesHz } from '@shared/limits/cells';
import { centiDbToDb } from '@shared/units/centi-decibels';
import { listBuilds } from '../builds/list-builds';
import type { Context } from '../context';
import { isoTime } from '../iso-time';
import type { FoundProduct } from '../products/find-product';
import { targetMarginOf } from '../products/target-margin';
import { type BuildCellsRow, type CellSeriesRow, listBuildCells } from './cells-store';
import type { SeriesChoice } from './trend-store';

/** Worst margin of every build and cell of a product, over the chosen series. Builds without a sweep are rows of nulls. */
export function marginMap(context: Context, { product, team }: FoundProduct, choice: SeriesChoice): MarginMapView {
  const rows = new Map(listBuildCells(context.db, product.id).map((row) => [row.buildId, row]));
  const builds = listBuilds(context, product.id);
  return {
    product: product.key,
    targetMarginDb: targetMarginOf(product, team),
    edgesHz: [...cellEdgesHz()],
    builds: builds.map(({ build, hardware, firmware }) => ({
      buildId: build.id,
      hardware,
      firmware,
      builtAt: isoTime(build.builtAt),
      verdict: build.verdict,
      isReference: build.id === product.referenceBuildId,
    })),
    cells: builds.map(({ build }) => marginsOf(rows.get(build.id), choice)),
  };
}

function marginsOf(row: BuildCellsRow | undefined, choice: SeriesChoice): (number | null)[] {
  if (row === undefined) return new Array<null>(CELL_COUNT).fill(null);
  const isAll = choice.stateId === undefined && choice.line === undefined && choice.detector === undefined;
  const cells = isAll ? int16(row.cells) : leastOf(int16(row.tile), row.series, choice);
  return Array.from(cells, (centiDb) => (centiDb === CELL_NOT_MEASURED ? null : centiDbToDb(centiDb)));
}

/** Least margin of every cell over the chosen series of a tile. */
function leastOf(tile: Int16Array, series: readonly CellSeriesRow[], choice: SeriesChoice): Int16Array {
  const least = new Int16Array(CELL_COUNT).fill(CELL_NOT_MEASURED);
  series.forEach((one, index) => {
    if (!isChosen(one, choice)) return;
    for (let cell = 0; cell < CELL_COUNT; cell++) {
      const centiDb = tile[index * CELL_COUNT + cell];
      const isWorse = least[cell] === CELL_NOT_MEASURED || centiDb < least[cell];
      if (centiDb !== CELL_NOT_MEASURED && isWorse) least[cell] = centiDb;
    }
  });
  return least;
}

function isChosen(series: CellSeriesRow, { stateId, line, detector }: SeriesChoice): boolean {
  return (
    (stateId === undefined || series.stateId === stateId) &&
    (line === undefined || series.line === line) &&
    (detector === undefined ? !series.isSuperseded : series.detector === detector)
  );
}

/** The bytes as Int16; copied, for a view would need an even address. */
function int16(bytes: Buffer): Int16Array {
  return new Int16Array(new Uint8Array(bytes).buffer);
}
