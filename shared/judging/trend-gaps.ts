/** A build of a trend; null where the band was not measured. */
export interface TrendBuild {
  readonly buildId: number;
  readonly worstMarginDb: number | null;
}

/** Builds in a row that were not measured. */
export interface TrendGap {
  readonly buildIds: readonly number[];
  /** The measured builds on either side; null at an end. */
  readonly before: number | null;
  readonly after: number | null;
  /** The build to measure first: it halves the search for a change inside the gap. */
  readonly halvingBuildId: number;
}

/**
 * Finds the stretches of a trend in which nothing was measured.
 * @param builds in build order
 * @returns gaps in that order
 * Source: our own definition.
 * Example: measured, not, not, not, measured gives one gap of three builds, to be halved at the second of them.
 */
export function trendGaps(builds: readonly TrendBuild[]): TrendGap[] {
  const gaps: TrendGap[] = [];
  let from = 0;
  while (from < builds.length) {
    if (builds[from].worstMarginDb !== null) {
      from++;
      continue;
    }
    let to = from;
    while (to < builds.length && builds[to].worstMarginDb === null) to++;
    const buildIds = builds.slice(from, to).map(({ buildId }) => buildId);
    gaps.push({
      buildIds,
      before: builds[from - 1]?.buildId ?? null,
      after: builds[to]?.buildId ?? null,
      halvingBuildId: buildIds[Math.floor((buildIds.length - 1) / 2)],
    });
    from = to;
  }
  return gaps;
}
