import type { BuildSummary } from '@shared/contracts/builds';
import { marginWords } from './margin-words';

/** A build that may show a fix, with what is known of it. */
export interface FixCandidate {
  id: number;
  words: string;
}

const VERDICT_WORDS = { lost: 'lost', gained: 'gained', held: 'held', cannotSay: 'cannot say' };

/** Measured builds after the one that lost, the newest first. */
export function fixCandidates(builds: readonly BuildSummary[], lostInId: number): FixCandidate[] {
  const lostIn = builds.find(({ id }) => id === lostInId);
  return builds
    .filter(({ position, sweepCount }) => sweepCount > 0 && position > (lostIn?.position ?? Infinity))
    .sort((a, b) => b.position - a.position)
    .map(({ id, hardware, firmware, verdict, worstMarginDb, isStale }) => {
      const standing = verdict === null || isStale ? 'not judged yet' : VERDICT_WORDS[verdict];
      const margin = worstMarginDb === null ? '' : `, ${marginWords(worstMarginDb)}`;
      return { id, words: `${hardware} / ${firmware}: ${standing}${margin}` };
    });
}
