/** A converter stage with the switching frequency declared for a build. */
export interface SwitchingStage {
  /** Such as 'PFC' or 'LLC'. */
  readonly stage: string;
  readonly frequencyHz: number;
  /** Total excursion of frequency spreading, percent of the frequency; 0 without. */
  readonly spreadPercent: number;
}
