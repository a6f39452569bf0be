import { OVERLAY_MOST_TRACES } from '@shared/contracts/overlay-most-traces';
import type { SweepView } from '@shared/contracts/sweeps';

export interface OverlayLink {
  readonly product: string;
  /** The team that owns the product. */
  readonly owner: string;
  /** Numbers of the sweeps as the overlay takes them: "12,15". */
  readonly sweeps: string;
}

/** Where ticked sweeps can be seen over each other, or why they cannot. */
export function overlayOf(ticked: readonly SweepView[]): OverlayLink | string {
  const [first] = ticked;
  if (!first) return 'Tick the sweeps that you want to see over each other.';
  if (ticked.some(({ product, team }) => product !== first.product || team !== first.team)) {
    return 'An overlay shows sweeps of one product: untick the others.';
  }
  if (ticked.length > OVERLAY_MOST_TRACES) {
    return `An overlay holds ${OVERLAY_MOST_TRACES} traces; ${ticked.length} are ticked.`;
  }
  return { product: first.product, owner: first.team, sweeps: ticked.map(({ id }) => id).join(',') };
}
