import type { DropSighting, DropSummary } from '@shared/contracts/drops';

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
