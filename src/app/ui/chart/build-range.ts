import type { PlotRange } from './plot-margins';

/** Builds in view by index; `to` is one past the last. Build i takes the stretch from i to i + 1. */
export interface BuildRange {
  from: number;
  to: number;
}

/** So few builds or fewer are no view worth zooming to. */
const LEAST_BUILDS = 2;

export function isSameRange(a: BuildRange, b: BuildRange): boolean {
  return a.from === b.from && a.to === b.to;
}

/** The part of a range that exists; the whole when too little of it does, as with an old link. */
export function rangeWithin(range: BuildRange | undefined, whole: BuildRange): BuildRange {
  if (!range) return whole;
  const from = Math.max(whole.from, range.from);
  const to = Math.min(whole.to, range.to);
  return to - from >= LEAST_BUILDS ? { from, to } : whole;
}

/** The range that a drag over a part of the plot asks for; the present one when the drag was too short. */
export function zoomedBuilds({ from, to }: BuildRange, { fromFraction, toFraction }: PlotRange): BuildRange {
  const count = to - from;
  const first = from + Math.floor(fromFraction * count);
  const last = from + Math.ceil(toFraction * count);
  return last - first >= LEAST_BUILDS ? { from: first, to: last } : { from, to };
}
