import type { Reason, ReasonCode } from './band-judgement';
import type { RunsNeeded } from './runs-to-settle';

const BENCH_FIRST = 'check the bench first';
const BACKGROUND = 'background of today';

const SETTLES: Record<Exclude<ReasonCode, 'withinSpread'>, string> = {
  notMeasured: 'a sweep of this build in this series',
  noReference: 'the next build, or the choice of a reference build measured in this series',
  limitDiffers: 'margins of both builds to the same limit line',
  rbwOutOfTolerance: 'a sweep with 9 kHz RBW',
  correctionUnknown: 'a statement with the sweep whether its levels are corrected',
  correctionDiffers: 'sweeps of both builds with the same corrections',
  bandNotCovered: 'a sweep over the whole band',
  staleTrace: 'a new sweep of this build',
  nearBackground: BACKGROUND,
  floorTooHigh: `${BACKGROUND}, or a sweep with less attenuation`,
  constantOffset: BENCH_FIRST,
  detectorOrder: BENCH_FIRST,
  sameDayShift: BENCH_FIRST,
};

const NUMBER_WORDS = [
  'no',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
];

function moreRuns(count: number): string {
  return `${NUMBER_WORDS[count] ?? count} more ${count === 1 ? 'run' : 'runs'}`;
}

function runsInWords(needed: RunsNeeded | null): string {
  if (needed === null) return 'more than twelve further runs of both builds';
  const ofBuild = `${moreRuns(needed.buildRuns)} of this build`;
  return needed.referenceRuns === 0
    ? ofBuild
    : `${ofBuild} and ${moreRuns(needed.referenceRuns)} of the reference build`;
}

/**
 * Says what would settle a "cannot say", most useful first and nothing twice.
 * @param reasons why nothing could be said
 * @param needed further runs, from `runsToSettle`
 * Example: a difference inside the spread gives ["two more runs of this build"].
 */
export function settlesFor(reasons: readonly Reason[], needed: RunsNeeded | null): string[] {
  const words = reasons.map(({ code }) => (code === 'withinSpread' ? runsInWords(needed) : SETTLES[code]));
  const benchFirst = [...words].sort((a, b) => Number(b === BENCH_FIRST) - Number(a === BENCH_FIRST));
  return [...new Set(benchFirst)];
}
