import type { Verdict } from '@shared/judging/verdict';

export interface JudgedBand {
  verdict: Verdict;
  differenceDb: number | null;
  marginDb: number | null;
}

/**
 * The one change of margin that stands for a build: the largest loss among the bands that lost, else the largest gain
 * among those that gained, else the change of the band with the least margin. Null when nothing was compared.
 */
export function judgedChange(bands: readonly JudgedBand[]): number | null {
  const differences = (verdict: Verdict) =>
    bands
      .filter((band) => band.verdict === verdict)
      .flatMap(({ differenceDb }) => (differenceDb === null ? [] : [differenceDb]));
  const lost = differences('lost');
  if (lost.length > 0) return Math.min(...lost);
  const gained = differences('gained');
  if (gained.length > 0) return Math.max(...gained);
  const closest = bands
    .filter((band) => band.differenceDb !== null && band.marginDb !== null)
    .sort((one, other) => (one.marginDb ?? 0) - (other.marginDb ?? 0));
  return closest[0]?.differenceDb ?? null;
}
