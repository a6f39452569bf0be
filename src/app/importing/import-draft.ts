import { computed, DestroyRef, inject, Injectable, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { PreviewTrace, ReadingView } from '@shared/contracts/imports';
import type { Frames } from '@shared/traces/frames';
import { catchError, EMPTY, map, mergeMap, Observable, shareReplay, Subject, tap } from 'rxjs';
import { problemOf } from '../ui/problem';
import { DraftFile, FileChoice, TraceChoice, Units } from './draft-file';
import { ImportApi } from './import-api';
import { suggestKind } from './suggest-kind';

/** How many files are read at once. */
const READ_AT_ONCE = 3;

/** The files that are on their way in, as long as the page is open: read one after the other, chosen for, not yet saved. */
@Injectable()
export class ImportDraft {
  private readonly api = inject(ImportApi);
  private readonly waiting = new Subject<{ id: number; team: string }>();
  private readonly frames = new Map<number, Observable<Frames<PreviewTrace>>>();
  private lastId = 0;

  private readonly list = signal<readonly DraftFile[]>([]);
  readonly files = this.list.asReadonly();
  readonly isReading = computed(() => this.list().some(({ reading, problem }) => !reading && !problem));

  constructor() {
    this.waiting
      .pipe(
        mergeMap(({ id, team }) => this.read(id, team), READ_AT_ONCE),
        takeUntilDestroyed(inject(DestroyRef)),
      )
      .subscribe();
  }

  /** Takes files in and has them read; one that is in the list already is not taken twice. */
  add(team: string, files: readonly File[]): void {
    const fresh = files.filter((file) => !this.list().some((other) => isSame(other.file, file)));
    const added = fresh.map((file): DraftFile => ({
      id: ++this.lastId,
      file,
      units: {},
      reading: null,
      problem: null,
      choice: {},
      traces: [],
    }));
    this.list.update((list) => [...list, ...added]);
    for (const { id } of added) this.waiting.next({ id, team });
  }

  remove(id: number): void {
    this.frames.delete(id);
    this.list.update((list) => list.filter((file) => file.id !== id));
  }

  clear(): void {
    this.frames.clear();
    this.list.set([]);
  }

  /** Reads a file again with the units that it leaves out. */
  setUnits(team: string, id: number, units: Units): void {
    this.frames.delete(id);
    this.change(id, (file) => ({ ...file, units, reading: null, problem: null }));
    this.waiting.next({ id, team });
  }

  choose(id: number, choice: Partial<FileChoice>): void {
    this.change(id, (file) => ({ ...file, choice: { ...file.choice, ...choice } }));
  }

  chooseTrace(id: number, index: number, choice: Partial<TraceChoice>): void {
    this.change(id, (file) => ({
      ...file,
      traces: file.traces.map((trace, place) => (place === index ? { ...trace, ...choice } : trace)),
    }));
  }

  /** The traces of a file in full, fetched once. */
  framesOf(team: string, { id, file, units }: DraftFile): Observable<Frames<PreviewTrace>> {
    const known = this.frames.get(id);
    if (known) return known;
    const frames = this.api.readFrames(team, file, units).pipe(shareReplay({ bufferSize: 1, refCount: false }));
    this.frames.set(id, frames);
    return frames;
  }

  private read(id: number, team: string): Observable<unknown> {
    const entry = this.list().find((file) => file.id === id);
    if (!entry) return EMPTY;
    const { file, units } = entry;
    return this.api.read(team, file, units).pipe(
      map((reading) => ({ reading, problem: null, ...choicesFor(entry, reading) })),
      catchError((error: unknown) => [{ reading: null, problem: problemOf(error) }]),
      tap((outcome) => this.change(id, (now) => (now.units === units ? { ...now, ...outcome } : now))),
    );
  }

  private change(id: number, change: (file: DraftFile) => DraftFile): void {
    this.list.update((list) => list.map((file) => (file.id === id ? change(file) : file)));
  }
}

/** What was chosen before stays where the traces are still the same in number. */
function choicesFor({ file, choice, traces }: DraftFile, reading: ReadingView): Pick<DraftFile, 'choice' | 'traces'> {
  const kind = choice.kind ?? suggestKind(file.name);
  return {
    choice: kind === undefined ? choice : { ...choice, kind },
    traces: reading.traces.map(({ name }, index): TraceChoice => {
      const suggested = kind === undefined ? suggestKind(name) : undefined;
      return traces[index] ?? { isLeftOut: false, ...(suggested && { kind: suggested }) };
    }),
  };
}

function isSame(a: File, b: File): boolean {
  return a.name === b.name && a.size === b.size && a.lastModified === b.lastModified;
}
