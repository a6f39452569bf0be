import type { BandJudgement, ReasonCode } from './band-judgement';

/** At most this many builds are pooled into a reference the team did not choose. */
export const MAX_POOLED_BUILDS = 5;
/** The spread is taken from at most this many builds: enough degrees of freedom, and not from a bench of years ago. */
export const MAX_HISTORY_BUILDS = 20;

/** Reasons of a "cannot say" that leave the measurement itself usable: too few runs, or nothing to compare with. */
export const USABLE_REASONS: readonly ReasonCode[] = ['withinSpread', 'noReference'];

/** An earlier build with its judgement in the series and band in question; null where it is not yet judged. */
export interface EarlierBuild {
  readonly buildId: number;
  readonly judgement: Pick<BandJudgement, 'verdict' | 'reasons' | 'differenceDb' | 'thresholdDb'> | null;
}

export interface ChosenReference {
  readonly kind: 'chosen' | 'pooled' | 'none';
  /** Builds whose runs are `BandInput.reference`. */
  readonly buildIds: readonly number[];
  /** Builds since the last judged change that no guard stopped, for `BandInput.history`. */
  readonly historyIds: readonly number[];
}

type Level = 'lost' | 'gained' | 'same';

function levelOf({ judgement }: EarlierBuild): Level {
  return judgement?.verdict === 'lost' || judgement?.verdict === 'gained' ? judgement.verdict : 'same';
}

/**
 * Index of the build that began the present level. Against pooled builds every lost or gained begins one; against one chosen
 * build a second lost in a row is the level of the first.
 */
function levelStart(earlier: readonly EarlierBuild[], isChosen: boolean): number {
  const start = earlier.findLastIndex((build, index) => {
    const level = levelOf(build);
    return isChosen ? index > 0 && level !== levelOf(earlier[index - 1]) : level !== 'same';
  });
  return Math.max(start, 0);
}

function isUsable({ judgement }: EarlierBuild): boolean {
  return (judgement?.reasons ?? []).every(({ code }) => USABLE_REASONS.includes(code));
}

/** Undecided only for want of runs, and within half the threshold: averaging it in moves the reference less than leaving it out. */
function isNear({ judgement }: EarlierBuild): boolean {
  if (judgement?.verdict !== 'cannotSay' || judgement.differenceDb === null) return false;
  return Math.abs(judgement.differenceDb) <= judgement.thresholdDb / 2;
}

/**
 * Names the builds a band of a build is compared with.
 *
 * The team's choice where there is one. Otherwise the builds of the present level: the one that began it (the last lost or
 * gained, or the first measured) and those judged held since, the latest `MAX_POOLED_BUILDS`. While these are fewer, builds
 * undecided only for want of runs and within half the threshold fill up: a single first run would keep every build after it
 * undecided.
 *
 * @param earlier builds measured in this series and band before the judged one, oldest first
 * @param chosenBuildId the team's reference build, or null
 * @returns the builds to pool, oldest first; kind 'none' when nothing usable was measured before. A chosen build that was
 *   not measured in the band gives 'none' too: the choice is never replaced silently.
 * Source: our own definition; only builds with no change between them are averaged.
 * Example: builds 1 (first measured), 2 (lost), 3 (held), 4 (held) give [2, 3, 4].
 */
export function chooseReference(earlier: readonly EarlierBuild[], chosenBuildId: number | null): ChosenReference {
  const level = earlier.slice(levelStart(earlier, chosenBuildId !== null)).filter(isUsable);
  const historyIds = level.slice(-MAX_HISTORY_BUILDS).map(({ buildId }) => buildId);
  if (chosenBuildId !== null) {
    const measured = earlier.some(({ buildId }) => buildId === chosenBuildId);
    return { kind: measured ? 'chosen' : 'none', buildIds: measured ? [chosenBuildId] : [], historyIds };
  }
  const settled = level.filter((build, index) => index === 0 || build.judgement?.verdict === 'held');
  const near = level.slice(1).filter(isNear);
  const places = Math.max(0, MAX_POOLED_BUILDS - settled.length);
  const pooled = [...settled.slice(-MAX_POOLED_BUILDS), ...(places > 0 ? near.slice(-places) : [])];
  const buildIds = level.filter((build) => pooled.includes(build)).map(({ buildId }) => buildId);
  return { kind: buildIds.length > 0 ? 'pooled' : 'none', buildIds, historyIds };
}
