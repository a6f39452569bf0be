import type { Detector } from '@shared/detectors/detectors';
import type { LimitLine } from '@shared/limits/limit-line';
import type { FrequencyRange } from './frequency-scale';

/** One sweep to draw. */
export interface SpectrumTrace {
  /** Stable among the traces of the chart. */
  id: string;
  /** What people call it: "C1 / 2.5.0, L, QP". */
  label: string;
  /** `build`: the one in question (accent); `reference`: thin neutral; `background`: pale fill; `other`: the set of eight. */
  role: 'build' | 'reference' | 'background' | 'other';
  detector: Detector;
  /** Conductor: L, N, ... */
  line: string;
  frequenciesHz: Float64Array;
  levelsDbuv: Float32Array;
}

export interface SpectrumLimit {
  /** "CISPR 32 class B, QP" */
  name: string;
  /** What is written on the line where that is not its name: the names of all lines that lie on each other, or nothing. */
  written?: string;
  line: LimitLine;
}

/** A frequency worth pointing out, such as a harmonic of a stage: "PFC n=2". */
export interface SpectrumMark {
  frequencyHz: number;
  label: string;
}

/** What the address keeps, so that a link shows what I see. */
export interface SpectrumView extends FrequencyRange {
  pinsHz: readonly number[];
}
