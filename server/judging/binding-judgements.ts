import type { BandJudgement } from '@shared/judging/band-judgement';

type Place = Pick<BandJudgement, 'stateId' | 'line' | 'detector' | 'band'> & { readonly worst: unknown };

/**
 * The judgements whose margin counts against the limit: all but those of PK readings where QP was measured too.
 *
 * A PK reading is held against the QP line because it can only overstate (common practice, no source); where the QP
 * reading itself is there, it decides.
 */
export function bindingJudgements<Judged extends Place>(judgements: readonly Judged[]): Judged[] {
  const quasiPeaks = new Set(
    judgements.filter(({ detector, worst }) => detector === 'QP' && worst !== null).map(channelOf),
  );
  return judgements.filter((judgement) => judgement.detector !== 'PK' || !quasiPeaks.has(channelOf(judgement)));
}

function channelOf({ stateId, line, band }: Place): string {
  return JSON.stringify([stateId, line, band]);
}
