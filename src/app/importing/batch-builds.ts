import type { ImportBatchView } from '@shared/contracts/imports';

type Item = ImportBatchView['items'][number];

/** A build that the sweeps of a batch went into. */
export interface BatchBuild {
  readonly product: string;
  readonly productName: string;
  readonly buildId: number;
  readonly sweeps: number;
  /** Least margin of those sweeps, dB; null when none has one. */
  readonly worstMarginDb: number | null;
}

/** The builds of a batch, the one with the least margin first; sweeps stored before count as well. */
export function batchBuilds(items: readonly Item[]): BatchBuild[] {
  const builds = new Map<number, BatchBuild>();
  for (const { productKey, productName, buildId, worstMarginDb } of items) {
    if (productKey === null || buildId === null) continue;
    const { sweeps = 0, worstMarginDb: before = null } = builds.get(buildId) ?? {};
    builds.set(buildId, {
      product: productKey,
      productName: productName ?? productKey,
      buildId,
      sweeps: sweeps + 1,
      worstMarginDb: lesser(before, worstMarginDb),
    });
  }
  return [...builds.values()].sort((a, b) => (a.worstMarginDb ?? Infinity) - (b.worstMarginDb ?? Infinity));
}

function lesser(a: number | null, b: number | null): number | null {
  if (a === null || b === null) return a ?? b;
  return Math.min(a, b);
}
