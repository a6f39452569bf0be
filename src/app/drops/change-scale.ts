import type { BandJudgement } from '@shared/judging/band-judgement';

/** Changes of margin, dB, at the two ends of a picture. */
export interface ChangeScale {
  fromDb: number;
  toDb: number;
}

/** A scale that holds every interval, the threshold and no change at all. */
export function changeScale(
  judgements: readonly Pick<BandJudgement, 'interval' | 'differenceDb' | 'thresholdDb'>[],
): ChangeScale {
  const endsDb = judgements.flatMap(({ interval, differenceDb, thresholdDb }) => [
    ...(interval ?? []),
    ...(differenceDb === null ? [] : [differenceDb]),
    -thresholdDb,
  ]);
  return { fromDb: Math.min(...endsDb, 0) - 0.7, toDb: Math.max(...endsDb, 0) + 0.7 };
}

export function changePercentAt(changeDb: number, { fromDb, toDb }: ChangeScale): number {
  return (100 * (changeDb - fromDb)) / (toDb - fromDb);
}
