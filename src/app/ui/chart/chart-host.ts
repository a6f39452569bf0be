import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  ElementRef,
  inject,
  input,
  output,
  signal,
  untracked,
  viewChild,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatTooltip } from '@angular/material/tooltip';
import type { ECharts, EChartsCoreOption } from 'echarts/core';
import { NGX_ECHARTS_CONFIG, NgxEchartsConfig, NgxEchartsDirective } from 'ngx-echarts';
import { Skeleton } from '../skeleton';
import { CHART_ENGINE } from './chart-engine';
import { chartPalette } from './chart-palette';
import { ChartReadout, Readout } from './chart-readout';
import type { ChartTable } from './chart-table';
import { ChartTableView } from './chart-table-view';
import { LegendEntry, pictureWithLegend } from './picture-with-legend';
import { PlotMargins, PlotPoint, PlotRange } from './plot-margins';
import { PlotPointer } from './plot-pointer';
import { saveFile } from './save-file';
import { toCsv } from './to-csv';

/** Pixels of a downloaded picture for each of the screen. */
const PNG_SCALE = 2;

/**
 * Every chart of the product stands in this frame: canvas, pointer and keyboard, downloads and the table view.
 * It is the only door to the drawing library. Builders such as SpectrumChart give it an option and answer its events.
 */
@Component({
  selector: 'app-chart-host',
  imports: [ChartReadout, ChartTableView, MatButton, MatIcon, MatTooltip, NgxEchartsDirective, PlotPointer, Skeleton],
  providers: [
    {
      provide: NGX_ECHARTS_CONFIG,
      useFactory: (): NgxEchartsConfig => ({ echarts: inject(CHART_ENGINE) }),
    },
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './chart-host.html',
  styleUrl: './chart-host.scss',
})
export class ChartHost {
  readonly option = input.required<EChartsCoreOption>();
  /** One sentence that says what the chart shows; read out before the table. */
  readonly ariaLabel = input.required<string>();
  readonly height = input(360);
  readonly margins = input.required<PlotMargins>();
  readonly table = input.required<ChartTable>();
  /** File name of downloads without its ending. */
  readonly fileName = input('chart');
  /** Rows of the CSV download where it holds more than the table. */
  readonly csvRows = input<() => Iterable<readonly (string | number | null)[]>>();
  /** Written above the chart in the downloaded picture. */
  readonly legend = input<readonly LegendEntry[]>([]);
  readonly readout = input<Readout | null>(null);
  readonly canZoom = input(true);
  readonly isZoomed = input(false);

  readonly hovered = output<PlotPoint | null>();
  readonly clicked = output<PlotPoint>();
  readonly zoomed = output<PlotRange>();
  readonly restored = output();
  readonly keyed = output<KeyboardEvent>();
  /** Width of the plot without its margins, px; told first and after every change. */
  readonly resized = output<number>();

  private readonly palette = chartPalette();
  private readonly chart = signal<ECharts | null>(null);
  private readonly frame = viewChild.required<ElementRef<HTMLElement>>('frame');
  protected readonly widthPx = signal(0);
  protected readonly isLoaded = signal(false);
  protected readonly isTable = signal(false);

  /** NOTE: ngx-echarts starts a second chart when its options change before the first has started, so they wait. */
  protected readonly shownOption = computed(() => (this.chart() ? this.option() : untracked(this.option)));

  constructor() {
    void inject(CHART_ENGINE)().then(() => this.isLoaded.set(true));
    const observer = new ResizeObserver(() => this.measure());
    afterNextRender(() => {
      observer.observe(this.frame().nativeElement);
      this.measure();
    });
    inject(DestroyRef).onDestroy(() => observer.disconnect());
  }

  protected keepChart(chart: ECharts): void {
    this.chart.set(chart);
  }

  protected savePng(): void {
    const palette = this.palette();
    const canvas = this.chart()?.renderToCanvas({ pixelRatio: PNG_SCALE, backgroundColor: palette.surface });
    if (!canvas) return;
    pictureWithLegend(canvas, this.legend(), PNG_SCALE, palette).toBlob((blob) => {
      if (blob) saveFile(`${this.fileName()}.png`, blob);
    });
  }

  protected saveCsv(): void {
    const { columns, rows } = this.table();
    const content = this.csvRows()?.() ?? [columns.map(({ label }) => label), ...rows];
    saveFile(`${this.fileName()}.csv`, new Blob([toCsv(content)], { type: 'text/csv' }));
  }

  private measure(): void {
    const widthPx = this.frame().nativeElement.clientWidth;
    if (widthPx === this.widthPx() || widthPx === 0) return;
    this.widthPx.set(widthPx);
    const { left, right } = this.margins();
    this.resized.emit(Math.max(1, widthPx - left - right));
  }
}
