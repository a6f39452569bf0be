import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { buildCells, builds } from '../db/schema';

export type CellSeriesRow = (typeof buildCells.$inferSelect)['series'][number];

export interface BuildCellsRow {
  buildId: number;
  series: CellSeriesRow[];
  cells: Buffer;
  tile: Buffer;
}

const COLUMNS = {
  buildId: buildCells.buildId,
  series: buildCells.series,
  cells: buildCells.cells,
  tile: buildCells.tile,
};

/** Margin map rows of a product's builds that have one, oldest first. */
export function listBuildCells(db: Database, productId: number): BuildCellsRow[] {
  return db
    .select(COLUMNS)
    .from(builds)
    .innerJoin(buildCells, eq(buildCells.buildId, builds.id))
    .where(eq(builds.productId, productId))
    .orderBy(asc(builds.position))
    .all();
}

/** Which series a product's builds were measured in, all of them or the named ones; builds without a sweep are absent. */
export function listMeasuredSeries(
  db: Database,
  productId: number,
  buildIds?: readonly number[],
): Map<number, CellSeriesRow[]> {
  const rows = db
    .select({ buildId: buildCells.buildId, series: buildCells.series })
    .from(buildCells)
    .innerJoin(builds, eq(builds.id, buildCells.buildId))
    .where(and(eq(builds.productId, productId), buildIds && inArray(buildCells.buildId, [...buildIds])))
    .all();
  return new Map(rows.map((row) => [row.buildId, row.series]));
}
