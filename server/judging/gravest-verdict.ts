import type { Verdict } from '@shared/judging/verdict';

/** What must be looked at first comes first. */
const GRAVEST_FIRST: readonly Verdict[] = ['lost', 'cannotSay', 'gained', 'held'];

/** The verdict that stands for a build: the gravest over all its bands and states; null when nothing was judged. */
export function gravestVerdict(verdicts: readonly Verdict[]): Verdict | null {
  return GRAVEST_FIRST.find((verdict) => verdicts.includes(verdict)) ?? null;
}
