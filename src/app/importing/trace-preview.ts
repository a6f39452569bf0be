import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import type { BatchItemTags } from '@shared/contracts/imports';
import type { OverlayTrace, SweepPage } from '@shared/contracts/sweeps';
import { findLimitSet } from '@shared/limits/limit-sets';
import { decodeFrames } from '@shared/traces/frames';
import { map, Observable, of, switchMap } from 'rxjs';
import { CurrentTeam } from '../session/current-team';
import { SpectrumChart } from '../ui/chart/spectrum-chart';
import type { SpectrumLimit, SpectrumTrace } from '../ui/chart/spectrum-types';
import { FrequencyPipe } from '../ui/frequency';
import { MarginValue } from '../ui/margin-value';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { TimeStamp } from '../ui/time-stamp';
import type { DraftFile } from './draft-file';
import { ImportDraft } from './import-draft';
import { previewMargin } from './preview-margin';

/** The last stored sweep of the same product, state, line and detector. */
interface LastRun {
  meta: OverlayTrace;
  trace: SpectrumTrace;
}

/** A trace of a file over the limit, before it is saved, with the last run of the same series to hold it against. */
@Component({
  selector: 'app-trace-preview',
  imports: [FrequencyPipe, MarginValue, ProblemBanner, Skeleton, SpectrumChart, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './trace-preview.html',
  styles: `
    :host {
      display: grid;
      gap: 8px;
    }
    .verdict {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 24px;
      font-size: 13px;
    }
  `,
})
export class TracePreview {
  private readonly http = inject(HttpClient);
  private readonly draft = inject(ImportDraft);
  protected readonly team = inject(CurrentTeam);

  readonly teamKey = input.required<string>();
  readonly file = input.required<DraftFile>();
  readonly index = input.required<number>();
  /** The tags the trace would be saved with. */
  readonly tags = input.required<BatchItemTags>();
  readonly limitSetKey = input<string>();

  private readonly source = computed(() => this.file(), {
    equal: (a, b) => a.id === b.id && a.units === b.units,
  });
  private readonly frames = rxResource({
    params: () => ({ team: this.teamKey(), file: this.source() }),
    stream: ({ params: { team, file } }) => this.draft.framesOf(team, file),
  });
  protected readonly problem = computed(() => {
    const error = this.frames.error();
    return error ? problemOf(error) : null;
  });

  private readonly series = computed(
    () => {
      const { product, state, line, detector, kind } = this.tags();
      return product && state && line && detector && kind === 'product'
        ? { product, state, line, detector }
        : undefined;
    },
    { equal: (a, b) => JSON.stringify(a) === JSON.stringify(b) },
  );
  private readonly lastRunOfSeries = rxResource<LastRun | null, Record<string, string> | undefined>({
    params: () => this.series(),
    stream: ({ params }) => this.findLastRun(params),
  });
  protected readonly lastRun = computed(() => (this.lastRunOfSeries.hasValue() ? this.lastRunOfSeries.value() : null));

  private readonly set = computed(() => {
    const key = this.limitSetKey();
    return key === undefined ? undefined : findLimitSet(key);
  });
  protected readonly limits = computed((): SpectrumLimit[] =>
    (this.set()?.lines ?? []).map((line) => ({ name: `${this.set()?.title}, ${line.detector}`, line })),
  );

  private readonly trace = computed((): SpectrumTrace | null => {
    const frames = this.frames.hasValue() ? this.frames.value() : undefined;
    const frame = frames?.traces[this.index()];
    if (!frames || !frame) return null;
    const { line, detector, kind } = this.tags();
    return {
      id: `new-${frame.meta.trace}`,
      label: [frame.meta.name, kind === 'background' ? 'background' : 'not saved yet'].join(', '),
      role: 'build',
      // Drawn as peak until it is known what it is.
      detector: detector ?? 'PK',
      line: line ?? '',
      frequenciesHz: frames.grids[frame.grid],
      levelsDbuv: frame.levelsDbuv,
    };
  });
  protected readonly traces = computed(() => {
    const trace = this.trace();
    const last = this.lastRun();
    return trace && (last ? [last.trace, trace] : [trace]);
  });

  /** Undefined while it cannot be known yet. */
  protected readonly worst = computed(() => {
    const trace = this.trace();
    const set = this.set();
    const { detector } = this.tags();
    return trace && set && detector && previewMargin(trace.frequenciesHz, trace.levelsDbuv, set, detector);
  });
  protected readonly worstHead = computed(() =>
    this.tags().kind === 'product' ? 'Worst margin, once saved' : 'Least distance to the limit',
  );

  private findLastRun(series: Record<string, string> | undefined): Observable<LastRun | null> {
    if (!series) return of(null);
    const params = { ...series, team: this.teamKey(), kind: 'product', limit: 1 };
    return this.http.get<SweepPage>('/api/v1/sweeps', { params }).pipe(
      switchMap(({ sweeps: [last] }) => {
        if (!last) return of(null);
        return this.http
          .get(`/api/v1/sweeps/${last.id}/trace`, {
            headers: { Accept: 'application/octet-stream' },
            responseType: 'arraybuffer',
          })
          .pipe(map(asLastRun));
      }),
    );
  }
}

function asLastRun(bytes: ArrayBuffer): LastRun | null {
  const { grids, traces } = decodeFrames<OverlayTrace>(bytes);
  const [frame] = traces;
  if (!frame) return null;
  const { meta } = frame;
  return {
    meta,
    trace: {
      id: `last-${meta.sweepId}`,
      label: `last run: ${meta.hardware} / ${meta.firmware}`,
      role: 'reference',
      detector: meta.detector as SpectrumTrace['detector'],
      line: meta.line,
      frequenciesHz: grids[frame.grid],
      levelsDbuv: frame.levelsDbuv,
    },
  };
}
