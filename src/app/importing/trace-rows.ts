import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { BatchTags } from '@shared/contracts/imports';
import { DETECTORS, type Line, LINES, SWEEP_KINDS, type SweepKind } from '@shared/detectors/detectors';
import { KIND_WORDS } from '../ui/kind-words';
import { DraftFile, ReadTrace, statedDetector, statedLine, TraceChoice } from './draft-file';

interface Row {
  read: ReadTrace;
  choice: TraceChoice;
  /** Empty: to be chosen. */
  line: Line | '';
  lines: readonly Line[];
  detector: string;
  detectors: readonly string[];
  role: SweepKind | 'leaveOut';
}

export interface ChosenTrace {
  index: number;
  choice: Partial<TraceChoice>;
}

/** The traces of a file, each with its role, line and detector. What the file itself names cannot be denied. */
@Component({
  selector: 'app-trace-rows',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './trace-rows.html',
  styleUrl: './trace-rows.scss',
})
export class TraceRows {
  readonly file = input.required<DraftFile>();
  readonly common = input.required<BatchTags>();
  /** Place of the trace whose spectrum is shown. */
  readonly shown = input.required<number>();
  readonly shownChange = output<number>();
  readonly chosen = output<ChosenTrace>();

  protected readonly kinds = SWEEP_KINDS;
  protected readonly kindWords = KIND_WORDS;

  protected readonly rows = computed((): Row[] => {
    const { reading, traces, choice: ofFile } = this.file();
    const common = this.common();
    return (reading?.traces ?? []).map((read, index) => {
      const choice = traces[index];
      const named = statedDetector(read);
      const line = statedLine(read);
      return {
        read,
        choice,
        line: choice.line ?? line ?? common.line ?? '',
        lines: linesFor(line),
        detector: choice.detector ?? named ?? common.detector ?? '',
        detectors: named ? [named] : DETECTORS,
        role: choice.isLeftOut ? 'leaveOut' : (choice.kind ?? ofFile.kind ?? common.kind ?? 'product'),
      };
    });
  });

  protected chooseLine(index: number, text: string): void {
    this.chosen.emit({ index, choice: { line: LINES.find((line) => line === text) } });
  }

  protected chooseDetector(index: number, text: string): void {
    this.chosen.emit({ index, choice: { detector: DETECTORS.find((detector) => detector === text) } });
  }

  protected chooseRole(index: number, text: string): void {
    const kind = SWEEP_KINDS.find((one) => one === text);
    this.chosen.emit({ index, choice: kind ? { isLeftOut: false, kind } : { isLeftOut: true } });
  }
}

/** Many instruments call the phase of a single-phase supply L1, so the two may stand for each other. */
function linesFor(named: Line | undefined): readonly Line[] {
  if (named === undefined) return LINES;
  return named === 'L' || named === 'L1' ? ['L', 'L1'] : [named];
}
