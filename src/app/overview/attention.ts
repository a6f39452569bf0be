import type { ProductSummary } from '@shared/contracts/products';

/** Why somebody should look at a product, gravest first. */
export const URGENCIES = ['over', 'belowTarget', 'lost', 'openQuestion', 'quiet'] as const;
export type Urgency = (typeof URGENCIES)[number];

/** Worst margin of the latest build, or of the last measured one before it: a build nobody measured hides nothing. */
export function standingMarginDb({ latestBuild, previousWorstMarginDb }: ProductSummary): number | null {
  return latestBuild?.worstMarginDb ?? previousWorstMarginDb;
}

/** A small margin outranks a big change: what is over the limit or below the target comes before what merely lost. */
export function urgencyOf(product: ProductSummary): Urgency {
  const marginDb = standingMarginDb(product);
  if (marginDb !== null && marginDb < 0) return 'over';
  if (marginDb !== null && marginDb < product.targetMarginDb) return 'belowTarget';
  if (product.openDrops > 0 || product.latestBuild?.verdict === 'lost') return 'lost';
  const isMeasured = (product.latestBuild?.worstMarginDb ?? null) !== null;
  return !isMeasured || product.unmeasuredStates.length > 0 ? 'openQuestion' : 'quiet';
}

/** Margin above the target, dB, negative below it; null where nothing was measured. */
export function spareDb(product: ProductSummary): number | null {
  const marginDb = standingMarginDb(product);
  return marginDb === null ? null : marginDb - product.targetMarginDb;
}

/** The most urgent first; among equals the one with the least margin relative to its target. */
export function byUrgency(products: readonly ProductSummary[]): ProductSummary[] {
  const rank = (product: ProductSummary) => URGENCIES.indexOf(urgencyOf(product));
  return [...products].sort(
    (a, b) =>
      rank(a) - rank(b) || (spareDb(a) ?? Infinity) - (spareDb(b) ?? Infinity) || a.name.localeCompare(b.name, 'en'),
  );
}
