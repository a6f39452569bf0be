import type { ReadingOptions, ReadingView } from '@shared/contracts/imports';
import type { Problem } from '@shared/contracts/problem';
import { type Detector, DETECTORS, type Line, LINES, type SweepKind } from '@shared/detectors/detectors';
import type * as z from 'zod';

export type Units = z.infer<typeof ReadingOptions>;

/** What the person chose for one trace; what is left out comes from the file, then from the common tags. */
export interface TraceChoice {
  readonly isLeftOut: boolean;
  readonly line?: Line;
  readonly detector?: Detector;
  readonly kind?: SweepKind;
}

/** What the person chose for one file against the common tags. */
export interface FileChoice {
  readonly state?: string;
  readonly kind?: SweepKind;
  /** ISO 8601, UTC. */
  readonly takenAt?: string;
  readonly run?: string;
}

/** A file on its way in: what was recognised in it, and what was chosen for it. */
export interface DraftFile {
  /** Stays the same as long as the file is in the list. */
  readonly id: number;
  readonly file: File;
  readonly units: Units;
  /** Null while the file is read, and when it cannot be. */
  readonly reading: ReadingView | null;
  readonly problem: Problem | null;
  readonly choice: FileChoice;
  /** One for every trace of the reading. */
  readonly traces: readonly TraceChoice[];
}

export type ReadTrace = ReadingView['traces'][number];

/** The line that the file itself names for a trace. */
export function statedLine({ line }: Pick<ReadTrace, 'line'>): Line | undefined {
  return LINES.find((one) => one === line);
}

/** The detector that the file itself names for a trace. */
export function statedDetector({ detector }: Pick<ReadTrace, 'detector'>): Detector | undefined {
  return DETECTORS.find((one) => one === detector);
}
