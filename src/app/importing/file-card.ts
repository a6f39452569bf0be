import { ChangeDetectionStrategy, Component, computed, input, linkedSignal, output } from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { BatchTags } from '@shared/contracts/imports';
import { formatFrequency } from '@shared/units/format-frequency';
import type { DraftFile, FileChoice, Units } from './draft-file';
import { FileChoices } from './file-choices';
import { traceTags } from './merge-tags';
import type { PlannedTrace } from './plan-import';
import { ReadingFacts } from './reading-facts';
import { alikeTraces } from './alike-traces';
import { ReadingProblem } from './reading-problem';
import { missingWords } from './tag-gaps';
import type { TagName } from './tag-words';
import { TracePreview } from './trace-preview';
import { ChosenTrace, TraceRows } from './trace-rows';
import { UnitsAsked } from './units-asked';

/** Tags that a file or trace may lack for itself; the others are missing from the common tags, which say so. */
const OF_FILE: ReadonlySet<TagName> = new Set(['state', 'line', 'detector', 'takenAt', 'run']);

/** One file on its way in: a line when folded, else what was recognised, its traces, and the spectrum of one of them. */
@Component({
  selector: 'app-file-card',
  imports: [
    FileChoices,
    MatButton,
    MatIcon,
    MatIconButton,
    ReadingFacts,
    ReadingProblem,
    TracePreview,
    TraceRows,
    UnitsAsked,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './file-card.html',
  styleUrl: './file-card.scss',
})
export class FileCard {
  readonly teamKey = input.required<string>();
  readonly file = input.required<DraftFile>();
  readonly common = input.required<BatchTags>();
  /** The file's traces that will be imported. */
  readonly planned = input.required<readonly PlannedTrace[]>();
  readonly states = input.required<readonly string[]>();
  readonly limitSetKey = input<string>();
  readonly isOpen = input.required<boolean>();
  /** Name of a file in the list with the very same content. */
  readonly twin = input<string>();

  readonly toggled = output();
  readonly removed = output();
  readonly unitsChosen = output<Units>();
  readonly chosen = output<Partial<FileChoice>>();
  readonly traceChosen = output<ChosenTrace>();

  /** Place of the trace whose spectrum is drawn. */
  protected readonly shown = linkedSignal<number, number>({
    source: () => this.file().traces.length,
    computation: (count, before) => (before && before.value < count ? before.value : 0),
  });
  /** The server did not look into the file: it may well be right, and can be read again. */
  protected readonly isUnanswered = computed(() => {
    const status = this.file().problem?.status;
    return status !== undefined && (status === 0 || status === 429 || status >= 500);
  });
  protected readonly asksForUnits = computed(() => {
    const { problem, units, reading } = this.file();
    if (units.frequencyUnit !== undefined || units.levelUnit !== undefined) return true;
    if (problem) return problem.needs !== undefined;
    return reading?.inferred.some(({ what }) => what === 'frequency unit') ?? false;
  });

  protected readonly shownTags = computed(() => ({
    ...this.common(),
    ...traceTags(this.file(), this.shown(), this.common()),
  }));

  protected readonly alikes = computed(() => alikeTraces(this.planned()));

  protected readonly summary = computed(() => {
    const { reading } = this.file();
    if (!reading) return '';
    const { traces, pointCount, startHz, stopHz } = reading;
    const count = traces.length === 1 ? 'one trace' : `${traces.length} traces`;
    return `${count}, ${pointCount.toLocaleString('en')} points, ${formatFrequency(startHz)} to ${formatFrequency(stopHz)}`;
  });

  protected readonly standing = computed(() => {
    const { reading, problem } = this.file();
    const planned = this.planned();
    if (this.isUnanswered()) return { word: 'not read yet', icon: 'refresh', look: 'open' } as const;
    if (problem && this.asksForUnits()) return { word: 'needs its units', icon: 'edit', look: 'open' } as const;
    if (problem) return { word: 'cannot be read', icon: 'error', look: 'bad' } as const;
    if (!reading) return { word: 'reading', icon: 'clock', look: 'quiet' } as const;
    if (planned.length === 0) return { word: 'left out', icon: 'minus', look: 'quiet' } as const;
    const missing = missingWords(planned.map(({ gaps }) => ({ gaps: gaps.filter(({ tag }) => OF_FILE.has(tag)) })));
    if (missing.length > 0) return { word: `needs ${missing.join(', ')}`, icon: 'edit', look: 'open' } as const;
    const isComplete = planned.every(({ gaps }) => gaps.length === 0);
    return isComplete
      ? ({ word: 'ready', icon: 'check', look: 'ready' } as const)
      : ({ word: 'waits for the tags', icon: 'clock', look: 'quiet' } as const);
  });
}
