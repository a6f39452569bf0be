/** Builds in view by index; `to` is one past the last. */
export interface BuildRange {
  from: number;
  to: number;
}

/** The range that `first` and `last` of an address name by build id; undefined when they do not name two builds in order. */
export function rangeOf(
  buildIds: readonly number[],
  first: string | undefined,
  last: string | undefined,
): BuildRange | undefined {
  const from = buildIds.indexOf(Number(first));
  const to = buildIds.indexOf(Number(last)) + 1;
  return from >= 0 && to - from >= 2 ? { from, to } : undefined;
}

/** The part of the address for a range; the whole product needs none, so that later builds come into view. */
export function zoomQuery(buildIds: readonly number[], { from, to }: BuildRange) {
  const isWhole = from === 0 && to === buildIds.length;
  return isWhole ? { first: null, last: null } : { first: buildIds[from], last: buildIds[to - 1] };
}
