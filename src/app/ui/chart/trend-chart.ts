import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
  output,
  signal,
} from '@angular/core';
import { formatDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';
import { CHIP_LOOKS } from '../chip-looks';
import { formatTime } from '../format-time';
import { TEAM_TIME_ZONE } from '../team-time-zone';
import { buildLabel } from './build-axis';
import { BuildRange, isSameRange, rangeWithin, zoomedBuilds } from './build-range';
import { ChartHost } from './chart-host';
import { chartPalette } from './chart-palette';
import type { Readout } from './chart-readout';
import { marginRange } from './margin-range';
import { atFraction, PlotPoint, PlotRange } from './plot-margins';
import { TrendLegend } from './trend-legend';
import { TREND_MARGINS, trendLooks, trendOption } from './trend-option';
import { trendTable } from './trend-table';
import type { TrendBuild, TrendSeries } from './trend-types';

/** Worst margin per build, with target and limit: hover reads, click or Enter opens the build, drag zooms on builds. */
@Component({
  selector: 'app-trend-chart',
  imports: [ChartHost, TrendLegend],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './trend-chart.html',
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
  `,
})
export class TrendChart {
  private readonly timeZone = inject(TEAM_TIME_ZONE);

  /** Oldest first. */
  readonly builds = input.required<readonly TrendBuild[]>();
  readonly series = input.required<readonly TrendSeries[]>();
  readonly targetMarginDb = input.required<number>();
  readonly initialRange = input<BuildRange>();
  readonly height = input(320);
  readonly fileName = input('trend');

  /** Id of the build that was clicked. */
  readonly buildChosen = output<number>();
  readonly rangeChanged = output<BuildRange>();

  private readonly palette = chartPalette();
  private readonly plotPx = signal(1200);
  private readonly whole = computed((): BuildRange => ({ from: 0, to: this.builds().length }));
  protected readonly range = linkedSignal(() => rangeWithin(this.initialRange(), this.whole()), { equal: isSameRange });
  private readonly cursor = linkedSignal<BuildRange, number | null>({ source: this.range, computation: () => null });
  protected readonly margins = TREND_MARGINS;
  protected readonly looks = computed(() => trendLooks(this.series(), this.palette()));

  protected readonly legend = computed(() =>
    this.series().map(({ label }, i) => ({ label, colour: this.looks()[i].colour, dash: 'solid' as const })),
  );

  protected readonly option = computed(() =>
    trendOption({
      builds: this.builds(),
      series: this.series(),
      targetMarginDb: this.targetMarginDb(),
      range: this.range(),
      margins: marginRange(this.series(), this.targetMarginDb()),
      plotPx: this.plotPx(),
      palette: this.palette(),
    }),
  );
  protected readonly isZoomed = computed(() => this.range().to - this.range().from < this.builds().length);
  protected readonly table = computed(() => trendTable(this.builds(), this.series(), this.range(), this.timeZone()));
  protected readonly ariaLabel = computed(
    () =>
      `Trend of the worst margin over ${this.range().to - this.range().from} builds. ` +
      'Left and right move from build to build, Enter opens the build, Escape shows all builds.',
  );
  protected readonly cursorPx = computed(() => this.readout()?.xPx);

  protected readonly readout = computed((): Readout | null => {
    const index = this.cursor();
    const build = index === null ? undefined : this.builds()[index];
    if (index === null || !build) return null;
    const { left, right } = TREND_MARGINS;
    const { from, to } = this.range();
    const drops = build.openDrops === 0 ? '' : `, ${build.openDrops} open ${build.openDrops === 1 ? 'drop' : 'drops'}`;
    return {
      xPx: atFraction((index + 0.5 - from) / (to - from), this.plotPx() + left + right, left, right),
      yPx: TREND_MARGINS.top + 24,
      title: buildLabel(build),
      subtitle:
        `${formatTime(build.builtAt, this.timeZone(), 'day')}, ${CHIP_LOOKS[build.verdict ?? 'unjudged'].word}${drops}` +
        (build.isReference ? ', reference' : ''),
      columns: ['worst margin', 'at', 'runs'],
      rows: this.series().map(({ label, points }, i) => {
        const point = points[index];
        return {
          colour: this.looks()[i].colour,
          label,
          cells: point
            ? [
                formatDecibels(point.marginDb),
                point.frequencyHz === null ? '' : formatFrequency(point.frequencyHz),
                point.runs === 1 ? 'single' : String(point.runs),
              ]
            : ['not measured', '', ''],
        };
      }),
    };
  });

  protected resize(plotPx: number): void {
    this.plotPx.set(plotPx);
  }

  protected hover(point: PlotPoint | null): void {
    this.cursor.set(point && this.buildAt(point));
  }

  protected open(point: PlotPoint): void {
    this.choose(this.buildAt(point));
  }

  protected zoom(part: PlotRange): void {
    this.show(zoomedBuilds(this.range(), part));
  }

  protected restore(): void {
    this.show(this.whole());
  }

  protected answerKey(event: KeyboardEvent): void {
    const cursor = this.cursor();
    const { from, to } = this.range();
    if (event.key === 'ArrowLeft') this.cursor.set(Math.max(from, (cursor ?? to) - 1));
    else if (event.key === 'ArrowRight') this.cursor.set(Math.min(to - 1, (cursor ?? from - 1) + 1));
    else if (event.key === 'Enter' && cursor !== null) this.choose(cursor);
    else if (event.key === 'Escape') this.restore();
    else return;
    event.preventDefault();
  }

  private buildAt({ xFraction }: PlotPoint): number {
    const { from, to } = this.range();
    return Math.min(to - 1, from + Math.floor(xFraction * (to - from)));
  }

  private choose(index: number): void {
    const build = this.builds()[index];
    if (build) this.buildChosen.emit(build.id);
  }

  private show(range: BuildRange): void {
    this.range.set(range);
    this.rangeChanged.emit(range);
  }
}
