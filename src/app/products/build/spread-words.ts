import type { JudgedSpread } from '@shared/judging/band-judgement';

/** Where a spread comes from, in a few words. */
export const SPREAD_WORDS: Record<JudgedSpread['source'], string> = {
  planning: 'planning value',
  mixed: 'few runs yet',
  own: "this bench's own",
};
