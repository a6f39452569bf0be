import { ChangeDetectionStrategy, Component, computed, input, linkedSignal, output, signal } from '@angular/core';
import { formatFrequency } from '@shared/units/format-frequency';
import { ChartHost } from './chart-host';
import { chartPalette } from './chart-palette';
import type { Readout } from './chart-readout';
import { fractionAt, FrequencyRange, frequencyAt, FULL_RANGE_HZ, rangeText } from './frequency-scale';
import { levelRange } from './level-range';
import { limitCsvRows, limitTable } from './limit-table';
import { atFraction, PlotPoint, PlotRange } from './plot-margins';
import { SpectrumLegend } from './spectrum-legend';
import { spectrumMargins, spectrumOption } from './spectrum-option';
import { SpectrumPins } from './spectrum-pins';
import { readTrace, SpectrumReading } from './spectrum-reading';
import { limitRows, traceRows } from './spectrum-readout';
import { spectrumCsvRows, spectrumTable } from './spectrum-table';
import type { SpectrumLimit, SpectrumMark, SpectrumTrace, SpectrumView } from './spectrum-types';
import { type TraceLook, traceLooks } from './trace-look';

/** The narrowest zoom: one part in two hundred of the frequency, about a receiver's bandwidth at 2 MHz. */
const NARROWEST_RATIO = 1.005;
/** Half width, in columns of the picture, within which the pointer finds a peak. */
const SNAP_COLUMNS = 6;

/** Sweeps over limit lines on a log frequency axis: hover reads, click pins, drag zooms, double click restores. */
@Component({
  selector: 'app-spectrum-chart',
  imports: [ChartHost, SpectrumLegend, SpectrumPins],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './spectrum-chart.html',
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
  `,
})
export class SpectrumChart {
  readonly traces = input.required<readonly SpectrumTrace[]>();
  readonly limits = input<readonly SpectrumLimit[]>([]);
  readonly marks = input<readonly SpectrumMark[]>([]);
  /** What the address asked for; later changes of the view come out of `viewChanged`. */
  readonly initialView = input<Partial<SpectrumView>>();
  readonly height = input(440);
  readonly fileName = input('spectrum');

  readonly viewChanged = output<SpectrumView>();

  private readonly palette = chartPalette();
  private readonly columns = signal(1200);
  protected readonly hidden = signal<ReadonlySet<string>>(new Set());
  protected readonly view = linkedSignal<SpectrumView>(
    () => ({ ...FULL_RANGE_HZ, pinsHz: [], ...this.initialView() }),
    {
      equal: isSameView,
    },
  );
  private readonly cursorHz = linkedSignal<FrequencyRange, number | null>({
    source: this.view,
    computation: () => null,
  });
  private readonly pointerY = signal(0.2);

  protected readonly margins = computed(() => spectrumMargins(this.marks().length > 0));
  protected readonly looks = computed(() => traceLooks(this.traces(), this.palette()));
  protected readonly shown = computed(() => this.traces().filter(({ id }) => !this.hidden().has(id)));
  private readonly levels = computed(() => levelRange(this.traces(), this.limits()));
  protected readonly legend = computed(() =>
    this.shown().map((trace) => ({ label: trace.label, ...this.lookOf(trace) })),
  );
  protected readonly isZoomed = computed(() => {
    const { fromHz, toHz } = this.view();
    return fromHz !== FULL_RANGE_HZ.fromHz || toHz !== FULL_RANGE_HZ.toHz;
  });

  protected readonly option = computed(() =>
    spectrumOption({
      traces: this.shown(),
      looks: this.shown().map((trace) => this.lookOf(trace)),
      limits: this.limits(),
      marks: this.marks(),
      pinsHz: this.view().pinsHz,
      range: this.view(),
      levels: this.levels(),
      columns: this.columns(),
      palette: this.palette(),
    }),
  );

  /** Without a trace to hold against them, the limit lines themselves are read. */
  protected readonly readsLimits = computed(() => this.shown().length === 0 && this.limits().length > 0);
  protected readonly table = computed(() =>
    this.readsLimits()
      ? limitTable(this.limits(), this.view())
      : spectrumTable(this.shown(), this.limits(), this.view()),
  );
  protected readonly csvRows = () =>
    this.readsLimits() ? limitCsvRows(this.limits()) : spectrumCsvRows(this.shown(), this.limits(), this.view());
  protected readonly ariaLabel = computed(
    () =>
      `${this.readsLimits() ? 'Limit lines' : `Spectrum of ${this.shown().length} sweeps`} ` +
      `from ${rangeText(this.view())}. ` +
      'Left and right move the cursor, Enter pins, plus and minus zoom, Escape shows the whole range.',
  );

  protected readonly readout = computed((): Readout | null => {
    const cursorHz = this.cursorHz();
    if (cursorHz === null) return null;
    const { left, right, top, bottom } = this.margins();
    const widthPx = this.columns() + left + right;
    return {
      xPx: atFraction(fractionAt(cursorHz, this.view()), widthPx, left, right),
      yPx: atFraction(this.pointerY(), this.height(), top, bottom),
      title: formatFrequency(cursorHz),
      subtitle: this.marksNear(cursorHz),
      ...(this.readsLimits() ? limitRows(this.limits(), cursorHz) : traceRows(this.readAt(cursorHz), this.colourOf)),
    };
  });

  protected readonly cursorPx = computed(() => this.readout()?.xPx);
  protected readonly pins = computed(() =>
    this.view().pinsHz.map((pinHz) => ({ pinHz, mark: this.marksNear(pinHz), readings: this.readAt(pinHz) })),
  );

  protected readonly colourOf = (trace: SpectrumTrace): string => this.lookOf(trace).colour;

  protected resize(widthPx: number): void {
    this.columns.set(widthPx);
  }

  protected hover(point: PlotPoint | null): void {
    this.cursorHz.set(point && this.snap(frequencyAt(point.xFraction, this.view())));
    if (point) this.pointerY.set(point.yFraction);
  }

  protected pin(point: PlotPoint): void {
    this.togglePin(this.snap(frequencyAt(point.xFraction, this.view())));
  }

  protected togglePin(pinHz: number): void {
    const { pinsHz, ...range } = this.view();
    const near = pinsHz.find(
      (other) => Math.abs(fractionAt(other, range) - fractionAt(pinHz, range)) * this.columns() < SNAP_COLUMNS,
    );
    this.show({
      ...range,
      pinsHz: near === undefined ? [...pinsHz, Math.round(pinHz)] : pinsHz.filter((other) => other !== near),
    });
  }

  protected zoom({ fromFraction, toFraction }: PlotRange): void {
    const view = this.view();
    const fromHz = frequencyAt(fromFraction, view);
    const toHz = frequencyAt(toFraction, view);
    if (toHz / fromHz < NARROWEST_RATIO) return;
    this.show({ ...view, fromHz: Math.round(fromHz), toHz: Math.round(toHz) });
  }

  protected restore(): void {
    this.show({ ...this.view(), ...FULL_RANGE_HZ });
  }

  protected toggle(id: string): void {
    const hidden = new Set(this.hidden());
    if (!hidden.delete(id)) hidden.add(id);
    this.hidden.set(hidden);
  }

  protected answerKey(event: KeyboardEvent): void {
    const stepsPx: Record<string, number> = { ArrowLeft: -1, ArrowRight: 1, PageDown: -40, PageUp: 40 };
    const stepPx = stepsPx[event.key];
    if (stepPx !== undefined) this.moveCursor(event.shiftKey ? stepPx * 10 : stepPx);
    else if (event.key === 'Enter' && this.cursorHz() !== null) this.togglePin(this.cursorHz() ?? 0);
    else if (event.key === '+') this.zoomAroundCursor(0.25);
    else if (event.key === '-') this.zoomAroundCursor(1);
    else if (event.key === 'Escape') this.restore();
    else return;
    event.preventDefault();
  }

  private moveCursor(stepPx: number): void {
    const fraction = fractionAt(this.cursorHz() ?? frequencyAt(0.5, this.view()), this.view());
    const next = Math.min(1, Math.max(0, fraction + stepPx / this.columns()));
    this.cursorHz.set(frequencyAt(next, this.view()));
  }

  /** Shows `half` of the present width, as a fraction, on either side of the cursor. */
  private zoomAroundCursor(half: number): void {
    const view = this.view();
    const centre = fractionAt(this.cursorHz() ?? frequencyAt(0.5, view), view);
    const fromHz = Math.max(FULL_RANGE_HZ.fromHz, frequencyAt(centre - half, view));
    const toHz = Math.min(FULL_RANGE_HZ.toHz, frequencyAt(centre + half, view));
    if (toHz / fromHz >= NARROWEST_RATIO) this.show({ ...view, fromHz: Math.round(fromHz), toHz: Math.round(toHz) });
  }

  private show(view: SpectrumView): void {
    this.view.set(view);
    this.viewChanged.emit(view);
  }

  /** The frequency of the first trace's highest point around the pointer, so that a peak is easy to hit. */
  private snap(frequencyHz: number): number {
    const lead = this.shown().find(({ role }) => role !== 'background');
    if (!lead) return frequencyHz;
    const reach = this.columnRatio() ** SNAP_COLUMNS;
    return readTrace(lead, frequencyHz / reach, frequencyHz * reach, [])?.frequencyHz ?? frequencyHz;
  }

  private readAt(frequencyHz: number): SpectrumReading[] {
    const half = Math.sqrt(this.columnRatio());
    return this.shown()
      .map((trace) => readTrace(trace, frequencyHz / half, frequencyHz * half, this.limits()))
      .filter((reading) => reading !== null);
  }

  private columnRatio(): number {
    const { fromHz, toHz } = this.view();
    return (toHz / fromHz) ** (1 / this.columns());
  }

  private lookOf(trace: SpectrumTrace): TraceLook {
    return this.looks()[this.traces().indexOf(trace)];
  }

  private marksNear(frequencyHz: number): string {
    const reach = this.columnRatio() ** SNAP_COLUMNS;
    return this.marks()
      .filter((mark) => mark.frequencyHz < frequencyHz * reach && mark.frequencyHz > frequencyHz / reach)
      .map(({ label }) => label)
      .join(', ');
  }
}

/** An address that repeats the present view redraws nothing. */
function isSameView(a: SpectrumView, b: SpectrumView): boolean {
  return a.fromHz === b.fromHz && a.toHz === b.toHz && a.pinsHz.join() === b.pinsHz.join();
}
