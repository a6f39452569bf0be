import type { BandJudgement } from '@shared/judging/band-judgement';
import { bindingJudgements } from '../judging/binding-judgements';

/** A judged band; `worst` is its worst margin in dB. */
export interface JudgedBand extends Pick<
  BandJudgement,
  'stateId' | 'line' | 'detector' | 'band' | 'verdict' | 'differenceDb'
> {
  readonly worst: number | null;
}

/**
 * The one change of margin that stands for a build, in dB: that of the band with the least margin among those that lost;
 * when none lost, among all. So it belongs to the verdict and the margin it stands beside, which a PK reading decides only
 * where no QP reading does. Null when nothing was compared.
 */
export function judgedChange(bands: readonly JudgedBand[]): number | null {
  const binding = bindingJudgements(bands);
  const isLost = ({ verdict }: JudgedBand) => verdict === 'lost';
  const [counted = binding] = [binding.filter(isLost), bands.filter(isLost)].filter((lost) => lost.length > 0);
  let tightest: JudgedBand | undefined;
  for (const band of counted) {
    if (band.differenceDb === null || band.worst === null) continue;
    if (tightest === undefined || band.worst < (tightest.worst ?? Infinity)) tightest = band;
  }
  return tightest?.differenceDb ?? null;
}
