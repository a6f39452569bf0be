import type { BandJudgement } from '@shared/judging/band-judgement';
import type { Verdict } from '@shared/judging/verdict';
import { bindingJudgements } from './binding-judgements';

/**
 * The verdict that stands for a build in lists: lost when any band lost, else that of the band with the least margin, the
 * one whose margin stands beside it. The gravest of all would read "cannot say" nearly always, since among dozens of bands
 * with margin to spare some are always too uncertain to be told. Null when nothing was judged.
 */
export function buildVerdict(judgements: readonly BandJudgement[]): Verdict | null {
  if (judgements.some(({ verdict }) => verdict === 'lost')) return 'lost';
  let tightest: BandJudgement | undefined;
  for (const judgement of bindingJudgements(judgements)) {
    if (tightest === undefined || marginOf(judgement) < marginOf(tightest)) tightest = judgement;
  }
  return tightest?.verdict ?? null;
}

function marginOf({ worst }: BandJudgement): number {
  return worst?.marginDb ?? Infinity;
}
