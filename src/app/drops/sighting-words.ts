import type { DropSighting, DropSummary } from '@shared/contracts/drops';
import { marginWords } from './margin-words';

export function buildName({ hardware, firmware }: { hardware: string; firmware: string }): string {
  return `${hardware} / ${firmware}`;
}

/** Where else the loss shows, in a few words; empty while only the build that raised it was measured. */
export function sightingWords({
  buildId,
  latest,
  noLongerSeenIn,
}: Pick<DropSummary, 'buildId' | 'latest' | 'noLongerSeenIn'>): string {
  if (noLongerSeenIn !== null) return `no longer in ${buildName(noLongerSeenIn)}`;
  return latest.buildId === buildId ? '' : `still in ${buildName(latest)}`;
}

/** The margin a build would have without the loss, roughly: its worst margin less its mean change. */
export function marginBeforeDb({ marginDb, differenceDb }: Pick<DropSighting, 'marginDb' | 'differenceDb'>): number {
  return marginDb - differenceDb;
}

/** Whether the newest build that is known of exceeds the limit by this loss; one where the margin is back does not. */
export function isOverNow({ latest, noLongerSeenIn }: Pick<DropSummary, 'latest' | 'noLongerSeenIn'>): boolean {
  return latest.isOverLimit && noLongerSeenIn === null;
}

/** What is left, and in which build: "1.9 dB left in C2 / 4.2.0", or that the margin is back. */
export function standingWords({ latest, noLongerSeenIn }: Pick<DropSummary, 'latest' | 'noLongerSeenIn'>): string {
  if (noLongerSeenIn !== null) return `The margin is back in ${buildName(noLongerSeenIn)}`;
  const words = `${marginWords(latest.marginDb)} in ${buildName(latest)}`;
  return `${words.charAt(0).toUpperCase()}${words.slice(1)}`;
}
