import type { BandJudgement } from '@shared/judging/band-judgement';

/**
 * The judgements whose margin counts against the limit: all but those of PK readings where QP was measured too.
 *
 * A PK reading is held against the QP line because it can only overstate (common practice, no source); where the QP
 * reading itself is there, it decides.
 */
export function bindingJudgements(judgements: readonly BandJudgement[]): BandJudgement[] {
  const quasiPeaks = new Set(
    judgements.filter(({ detector, worst }) => detector === 'QP' && worst !== null).map(channelOf),
  );
  return judgements.filter((judgement) => judgement.detector !== 'PK' || !quasiPeaks.has(channelOf(judgement)));
}

function channelOf({ stateId, line, band }: BandJudgement): string {
  return JSON.stringify([stateId, line, band]);
}
