import type { BenchView } from '@shared/contracts/benches';
import { PLANNING_SPREAD } from '@shared/judging/estimate-spreads';
import type { Context } from '../context';
import { listLastSpreads } from './bench-store';

/**
 * The spread of runs on a bench, as the judgement last used it: the widest of its bands for the newest judged build that
 * was measured there, so that what stands here and in a verdict is the same. The planning value until there is one.
 */
export function benchSpread(context: Context, benchId: number): BenchView['spread'] {
  const spreads = listLastSpreads(context.db, benchId).sort((a, b) => b.spread.sdDb - a.spread.sdDb);
  const [widest] = spreads;
  if (widest === undefined) {
    const { sd, degreesOfFreedom } = PLANNING_SPREAD;
    return { sdDb: sd, degreesOfFreedom, source: "planning value, not yet this bench's own" };
  }
  const { product, hardware, firmware, spread } = widest;
  return {
    sdDb: spread.sdDb,
    degreesOfFreedom: spread.degreesOfFreedom,
    source: `${spread.text}; the widest band of ${product} ${hardware} / ${firmware}, as judged`,
  };
}
