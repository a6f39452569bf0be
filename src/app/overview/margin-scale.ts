import type { ProductSummary } from '@shared/contracts/products';

/** Ends of the margin axis that all products of the overview share, dB. */
export interface MarginScale {
  fromDb: number;
  toDb: number;
}

const STEP_DB = 5;
/** Beyond this, dB, more margin says nothing more; a bar that reaches it ends in an open edge. */
const ENOUGH_DB = 20;

/** The least whole fives that hold the limit, every target and every margin up to 20 dB. */
export function marginScale(products: readonly ProductSummary[]): MarginScale {
  const margins = products.flatMap(({ latestBuild, previousWorstMarginDb, targetMarginDb }) => [
    latestBuild?.worstMarginDb ?? 0,
    previousWorstMarginDb ?? 0,
    targetMarginDb,
  ]);
  return {
    fromDb: Math.floor(Math.min(0, ...margins) / STEP_DB) * STEP_DB,
    toDb: Math.min(ENOUGH_DB, Math.ceil(Math.max(STEP_DB * 2, ...margins) / STEP_DB) * STEP_DB),
  };
}

/** Where a margin lies on the scale, percent of its length, at most its ends. */
export function percentAt(marginDb: number, { fromDb, toDb }: MarginScale): number {
  const percent = ((marginDb - fromDb) / (toDb - fromDb)) * 100;
  return Math.min(100, Math.max(0, percent));
}
