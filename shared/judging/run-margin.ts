export const CORRECTION_STATES = ['inFile', 'none', 'unknown'] as const;

/** Whether the stored levels already hold LISN, cable and limiter factors. */
export type CorrectionState = (typeof CORRECTION_STATES)[number];

/** The worst point of one sweep in one band, with the set-up it was taken with. A sweep without a point in the band has none. */
export interface RunMargin {
  readonly sweepId: number;
  readonly buildId: number;
  /** Sweeps of one session share it; repeats are different runs. */
  readonly run: string;
  readonly unit: string | null;
  readonly bench: string;
  /** UTC, ms. */
  readonly takenAt: number;
  readonly limitLineKey: string;
  readonly rbwHz: number | null;
  readonly stepHz: number;
  readonly attenuationDb: number | null;
  readonly correction: CorrectionState;
  readonly gridId: number;
  /** Hash of the levels alone: two sweeps with the same one are one reading stored twice. */
  readonly readingHash: string;
  readonly marginDb: number;
  readonly frequencyHz: number;
  readonly levelDbuv: number;
  readonly limitDbuv: number;
  /** Limit less floor, in dB; null where no floor could be told. */
  readonly floorMarginDb: number | null;
  /** 0 to 1. */
  readonly coveredFraction: number;
  /** Level of the background sweep of the same bench and day at `frequencyHz`. */
  readonly backgroundLevelDbuv: number | null;
  /** A PK sweep's own worst margin in this band to the AV line, where the plan has one. */
  readonly averageLineMarginDb?: number | null;
}
