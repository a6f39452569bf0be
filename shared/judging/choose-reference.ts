import type { ReasonCode } from './band-judgement';
import type { Verdict } from './verdict';

/** At most this many builds are pooled into a reference the team did not choose. */
export const MAX_POOLED_BUILDS = 5;
/** The spread is taken from at most this many builds: enough degrees of freedom, and not from a bench of years ago. */
export const MAX_HISTORY_BUILDS = 20;

/** Reasons of a "cannot say" that leave the measurement itself usable for the spread. */
const USABLE_REASONS: readonly ReasonCode[] = ['withinSpread', 'noReference'];

/** An earlier build as judged in the series and band in question; `verdict` null where it is not yet judged. */
export interface EarlierBuild {
  readonly buildId: number;
  readonly verdict: Verdict | null;
  /** Codes of the reasons of that judgement. */
  readonly reasons: readonly ReasonCode[];
}

export interface ChosenReference {
  readonly kind: 'chosen' | 'pooled' | 'none';
  readonly buildIds: readonly number[];
  /** Builds since the last judged change that no guard stopped, for `BandInput.history`. */
  readonly historyIds: readonly number[];
}

/**
 * Names the builds a band of a build is compared with.
 *
 * The team's choice where there is one; otherwise the latest builds judged held since the last judged change, with the
 * build of that change (or the first one measured), which began the present level: at most `MAX_POOLED_BUILDS`.
 *
 * @param earlier builds measured in this series and band before the judged one, oldest first
 * @param chosenBuildId the team's reference build, or null
 * @returns the builds to pool; kind 'none' when nothing was measured before. A chosen build that was not measured in the
 *   band gives 'none' too: the choice is never replaced silently.
 * Source: our own definition; only builds with no change between them are averaged.
 * Example: builds 1 (first measured), 2 (lost), 3 (held), 4 (held) give [2, 3, 4].
 */
export function chooseReference(earlier: readonly EarlierBuild[], chosenBuildId: number | null): ChosenReference {
  const changeAt = earlier.findLastIndex(({ verdict }) => verdict === 'lost' || verdict === 'gained');
  const sinceChange = earlier
    .slice(Math.max(changeAt, 0))
    .filter(({ reasons }) => reasons.every((code) => USABLE_REASONS.includes(code)));
  const historyIds = sinceChange.slice(-MAX_HISTORY_BUILDS).map(({ buildId }) => buildId);
  if (chosenBuildId !== null) {
    const measured = earlier.some(({ buildId }) => buildId === chosenBuildId);
    return { kind: measured ? 'chosen' : 'none', buildIds: measured ? [chosenBuildId] : [], historyIds };
  }
  const level = sinceChange.filter(({ verdict }, index) => index === 0 || verdict === 'held');
  const buildIds = level.slice(-MAX_POOLED_BUILDS).map(({ buildId }) => buildId);
  return { kind: buildIds.length > 0 ? 'pooled' : 'none', buildIds, historyIds };
}
