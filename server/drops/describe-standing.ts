import type { BandJudgement } from '@shared/judging/band-judgement';
import type { Verdict } from '@shared/judging/verdict';
import { formatSignedDecibels } from '@shared/units/format-decibels';

const WORDS: Record<Verdict, string> = { lost: 'lost', gained: 'gained', held: 'held', cannotSay: 'cannot say' };

/** How the series of one operating state and band stand now, such as "L QP held (-0.4 dB); N QP cannot say: ...". */
export function describeStanding(judgements: readonly BandJudgement[]): string {
  if (judgements.length === 0) return 'this build is no longer measured there.';
  const parts = judgements.map(({ line, detector, verdict, differenceDb, reasons }) => {
    const change = differenceDb === null ? '' : ` (${formatSignedDecibels(differenceDb)})`;
    const why = reasons.length > 0 ? `: ${reasons.map(({ text }) => text).join(', ')}` : '';
    return `${line} ${detector} ${WORDS[verdict]}${change}${why}`;
  });
  return `${parts.join('; ')}.`;
}
