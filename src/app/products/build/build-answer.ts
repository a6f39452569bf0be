import type { BuildView } from '@shared/contracts/builds';
import type { DropSummary } from '@shared/contracts/drops';
import type { VerdictsView } from '@shared/contracts/judging';
import { formatDecibels, formatSignedDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';

type BandVerdict = VerdictsView['verdicts'][number];

/** The sentence a build opens with: what changed, or why nothing can be said. */
export function buildAnswer(
  build: Pick<BuildView, 'sweepCount'>,
  judged: VerdictsView,
  drops: readonly DropSummary[],
): string {
  const { verdicts } = judged;
  if (build.sweepCount === 0) return 'Nothing was measured on this build.';
  if (verdicts.length === 0) return 'Not judged yet: the next run of the judgement takes it up.';
  const lost = verdicts.filter(({ verdict }) => verdict === 'lost');
  if (lost.length > 0) return drops[0]?.sentence ?? largestChange('Lost', lost, judged);
  const compared = verdicts.filter(({ differenceDb }) => differenceDb !== null);
  if (compared.length === 0) return nothingCompared(verdicts);
  const gained = verdicts.filter(({ verdict }) => verdict === 'gained');
  if (gained.length > 0) return largestChange('Gained', gained, judged);
  const open = verdicts.filter(({ verdict }) => verdict === 'cannotSay');
  if (open.length === 0) {
    const { thresholdDb } = verdicts[0].judgement;
    return `No change of ${formatDecibels(thresholdDb)} or more against ${referenceWords(judged)}, in ${countWords(verdicts)}.`;
  }
  return `Nothing lost, but ${open.length} of ${countWords(verdicts)} against ${referenceWords(judged)} cannot be decided.`;
}

/** The margin left, in a second sentence; null where nothing was measured. */
export function marginSentence(
  marginDb: number | null,
  frequencyHz: number | null,
  targetMarginDb: number,
): string | null {
  if (marginDb === null) return null;
  const place = frequencyHz === null ? '' : ` at ${formatFrequency(frequencyHz)}`;
  const target = formatDecibels(targetMarginDb);
  // Rounded to 0.1 dB a margin of -0.04 dB would read "0.0 dB" though the limit is exceeded.
  if (marginDb < 0) return `${marginDb > -0.05 ? 'Just' : formatDecibels(-marginDb)} over the limit${place}.`;
  const side = marginDb < targetMarginDb ? 'below' : 'at or above';
  return `${formatDecibels(marginDb)} left to the limit${place}, ${side} the target of ${target}.`;
}

/** What would settle most of what cannot be decided, with how many comparisons it settles. */
export function mostUseful(verdicts: readonly BandVerdict[]): { words: string; count: number } | null {
  const counts = new Map<string, number>();
  for (const { verdict, judgement } of verdicts) {
    const words = judgement.settles[0];
    if (verdict === 'cannotSay' && words !== undefined) counts.set(words, (counts.get(words) ?? 0) + 1);
  }
  const most = [...counts].sort(([, a], [, b]) => b - a)[0];
  return most ? { words: most[0], count: most[1] } : null;
}

/** "C2 / 3.6.2", or how many builds were pooled. */
export function referenceWords({ referenceKind, referenceBuilds }: VerdictsView): string {
  const [first] = referenceBuilds;
  if (first === undefined) return 'the reference';
  const names = referenceBuilds.map(({ hardware, firmware }) => `${hardware} / ${firmware}`);
  if (referenceKind === 'chosen' && names.length === 1) return names[0];
  return names.length === 1 ? `${names[0]}, the last build judged held` : `${names.length} builds judged held, pooled`;
}

function largestChange(verb: string, verdicts: readonly BandVerdict[], judged: VerdictsView): string {
  const { differenceDb, state, band, line, detector } = verdicts.reduce((most, one) =>
    Math.abs(one.differenceDb ?? 0) > Math.abs(most.differenceDb ?? 0) ? one : most,
  );
  const size = formatSignedDecibels(Math.abs(differenceDb ?? 0)).slice(1);
  return `${verb} ${size} in ${band} on ${line} (${detector}, ${state}) against ${referenceWords(judged)}.`;
}

function nothingCompared(verdicts: readonly BandVerdict[]): string {
  const reasons = new Set(verdicts.flatMap(({ judgement }) => judgement.reasons.map(({ code }) => code)));
  if (reasons.size === 1 && reasons.has('noReference')) {
    return 'There was no build to compare with yet, so no change can be judged.';
  }
  return 'No band could be compared with the reference; the reasons stand below.';
}

function countWords(verdicts: readonly BandVerdict[]): string {
  return `${verdicts.length} ${verdicts.length === 1 ? 'comparison' : 'comparisons'}`;
}
