import type { Detector, Line } from '@shared/detectors/detectors';
import type { GuardHit } from './guard-hit';
import type { RunMargin } from './run-margin';

/** A spread measured elsewhere, e.g. by a repeat study of the bench: s_I with its degrees of freedom. */
export interface MeasuredSpread {
  readonly sdDb: number;
  readonly degreesOfFreedom: number;
}

export interface BandInput {
  /** Key of the band, e.g. '0.15-0.5 MHz'. */
  readonly band: string;
  readonly build: readonly RunMargin[];
  /** Runs of the builds `chooseReference` named; empty on the first measured build. */
  readonly reference: readonly RunMargin[];
  /** Runs of the build measured before this one; shown beside the reference. */
  readonly previous: readonly RunMargin[];
  /** Runs of all earlier builds since the last judged change, any order, at most the latest 20 builds; the spread is taken from them. */
  readonly history: readonly RunMargin[];
  /** A repeat study of this bench and band, where one was made. */
  readonly spread: MeasuredSpread | null;
  /** What the bench-or-product tests found for this band (find-constant-offset, detector-order, same-day-shift). */
  readonly guards: readonly GuardHit[];
}

export interface SeriesInput {
  readonly stateId: number;
  readonly stateName: string;
  readonly line: Line;
  readonly detector: Detector;
  readonly limitLineKey: string;
  readonly bands: readonly BandInput[];
}

/** The laboratory's budget, expanded (k = 2), in dB. */
export interface LabUncertainty {
  readonly labDb: number;
  readonly cisprDb: number;
}

/** Everything one build is judged on: all its series, since p is adjusted over all of them. */
export interface BuildInput {
  readonly series: readonly SeriesInput[];
  /** The smallest change worth a flag, dB, > 0. */
  readonly thresholdDb: number;
  readonly targetMarginDb: number;
  readonly uncertainty?: LabUncertainty | null;
}
