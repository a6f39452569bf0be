import type { Detector, Line } from '@shared/detectors/detectors';
import type { BandJudgement } from './band-judgement';

/** A series that lost in the drop's band. */
export interface Witness {
  readonly line: Line;
  readonly detector: Detector;
  readonly differenceDb: number;
  readonly worstMarginDb: number;
  readonly frequencyHz: number;
}

/** A loss of margin of one build in one operating state and band. */
export interface Drop {
  readonly stateId: number;
  readonly stateName: string;
  readonly band: string;
  /** The witness with the least margin left; the drop is described by it. */
  readonly lead: BandJudgement;
  readonly witnesses: readonly Witness[];
  readonly overLimit: boolean;
  readonly leastMarginDb: number;
  /** Largest loss among the witnesses, dB, positive. */
  readonly sizeDb: number;
}
