import type { Verdict } from '@shared/judging/verdict';

export interface JudgedBand {
  verdict: Verdict;
  differenceDb: number | null;
  marginDb: number | null;
}

/**
 * The one change of margin that stands for a build, in dB: that of the band with the least margin among those that lost;
 * when none lost, among all. So it belongs to the verdict and the margin it stands beside. Null when nothing was compared.
 */
export function judgedChange(bands: readonly JudgedBand[]): number | null {
  const lost = bands.filter(({ verdict }) => verdict === 'lost');
  let tightest: JudgedBand | undefined;
  for (const band of lost.length > 0 ? lost : bands) {
    if (band.differenceDb === null || band.marginDb === null) continue;
    if (tightest === undefined || band.marginDb < (tightest.marginDb ?? Infinity)) tightest = band;
  }
  return tightest?.differenceDb ?? null;
}
