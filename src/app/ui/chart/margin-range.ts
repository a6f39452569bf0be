import type { TrendSeries } from './trend-types';

const STEP_DB = 5;

/** Ends of the margin axis: whole fives around all points and spreads; 0 dB and the target are always in view. */
export function marginRange(series: readonly TrendSeries[], targetMarginDb: number) {
  let lowestDb = 0;
  let highestDb = targetMarginDb;
  for (const point of series.flatMap(({ points }) => points)) {
    if (!point) continue;
    lowestDb = Math.min(lowestDb, point.lowestDb ?? point.marginDb);
    highestDb = Math.max(highestDb, point.highestDb ?? point.marginDb);
  }
  return {
    fromDb: lowestDb < 0 ? Math.floor((lowestDb - 1) / STEP_DB) * STEP_DB : -2,
    toDb: Math.ceil((highestDb + 1) / STEP_DB) * STEP_DB,
  };
}
