import { ChangeDetectionStrategy, Component, computed, input, linkedSignal, output, signal } from '@angular/core';
import { formatDecibels } from '@shared/units/format-decibels';
import { CHIP_LOOKS } from '../chip-looks';
import { AxisBuild, buildLabel } from './build-axis';
import { BuildRange, isSameRange, rangeWithin, zoomedBuilds } from './build-range';
import { ChartHost } from './chart-host';
import { chartPalette } from './chart-palette';
import type { Readout } from './chart-readout';
import { columnBuilds, columnCount, marginGrid } from './margin-grid';
import { drawMarginImage } from './margin-image';
import { MARGIN_MAP_MARGINS, marginMapOption } from './margin-map-option';
import { cellText, marginMapCsvRows, marginMapTable } from './margin-map-table';
import { MarginRampLegend } from './margin-ramp-legend';
import type { PlotPoint, PlotRange } from './plot-margins';

/** A cell of the map: one build in one cell of frequency. */
export interface MarginMapCell {
  buildId: number;
  fromHz: number;
  toHz: number;
  marginDb: number | null;
}

interface Cursor {
  build: number;
  cell: number;
}

/** Builds x frequency, coloured by margin: hover reads, click or Enter opens, drag zooms on builds, double click restores. */
@Component({
  selector: 'app-margin-map',
  imports: [ChartHost, MarginRampLegend],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './margin-map.html',
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
    .cell {
      position: absolute;
      outline: 2px solid var(--sl-ink);
      outline-offset: 1px;
      pointer-events: none;
    }
  `,
})
export class MarginMap {
  /** Oldest first. */
  readonly builds = input.required<readonly AxisBuild[]>();
  /** Cell edges, one more than cells. */
  readonly edgesHz = input.required<readonly number[]>();
  /** One row of cells a build, dB, null where not measured. */
  readonly cells = input.required<readonly (readonly (number | null)[])[]>();
  readonly targetMarginDb = input.required<number>();
  readonly initialRange = input<BuildRange>();
  readonly height = input(380);
  readonly fileName = input('margin-map');

  readonly cellChosen = output<MarginMapCell>();
  readonly rangeChanged = output<BuildRange>();

  private readonly palette = chartPalette();
  private readonly plotPx = signal(1200);
  private readonly whole = computed((): BuildRange => ({ from: 0, to: this.builds().length }));
  protected readonly range = linkedSignal(() => rangeWithin(this.initialRange(), this.whole()), { equal: isSameRange });
  protected readonly cursor = linkedSignal<BuildRange, Cursor | null>({ source: this.range, computation: () => null });
  protected readonly margins = MARGIN_MAP_MARGINS;

  private readonly columns = computed(() => columnCount(this.range(), this.plotPx()));
  private readonly picture = computed(() => {
    const { top, bottom } = MARGIN_MAP_MARGINS;
    const scale = window.devicePixelRatio;
    return drawMarginImage(
      marginGrid(this.cells(), this.range(), this.columns()),
      this.targetMarginDb(),
      this.plotPx() * scale,
      (this.height() - top - bottom) * scale,
      this.palette(),
    );
  });

  protected readonly option = computed(() =>
    marginMapOption({
      builds: this.builds(),
      edgesHz: this.edgesHz(),
      range: this.range(),
      picture: this.picture(),
      plotPx: this.plotPx(),
      palette: this.palette(),
    }),
  );
  protected readonly isZoomed = computed(() => this.range().to - this.range().from < this.builds().length);
  protected readonly table = computed(() =>
    marginMapTable(this.builds(), this.edgesHz(), this.cells(), this.targetMarginDb(), this.range()),
  );
  protected readonly csvRows = () => marginMapCsvRows(this.builds(), this.edgesHz(), this.cells());
  protected readonly ariaLabel = computed(
    () =>
      `Margin map of ${this.range().to - this.range().from} builds from 150 kHz to 30 MHz. ` +
      'Arrow keys move from cell to cell, Enter opens the build, Escape shows all builds.',
  );

  /** Place and size of the cell under the cursor, px. */
  protected readonly box = computed(() => {
    const cursor = this.cursor();
    if (!cursor) return null;
    const { left, top, bottom } = MARGIN_MAP_MARGINS;
    const { from, to } = this.range();
    const widthPx = Math.max(1, this.plotPx() / (to - from));
    const heightPx = (this.height() - top - bottom) / this.cellCount();
    return {
      leftPx: left + ((cursor.build - from) / (to - from)) * this.plotPx(),
      topPx: top + (this.cellCount() - 1 - cursor.cell) * heightPx,
      widthPx,
      heightPx,
    };
  });

  protected readonly readout = computed((): Readout | null => {
    const cursor = this.cursor();
    const box = this.box();
    if (!cursor || !box) return null;
    const isLeftHalf = box.leftPx < MARGIN_MAP_MARGINS.left + this.plotPx() / 2;
    const build = this.builds()[cursor.build];
    const marginDb = this.cells()[cursor.build][cursor.cell];
    return {
      xPx: isLeftHalf ? box.leftPx + box.widthPx : box.leftPx,
      yPx: box.topPx,
      title: marginDb === null ? 'not measured' : `${formatDecibels(marginDb)} of margin${this.standing(marginDb)}`,
      subtitle: `${cellText(cursor.cell, this.edgesHz())}, build ${buildLabel(build)}`,
      rows: [
        {
          label: build.isReference ? 'Reference build' : 'Verdict',
          cells: [CHIP_LOOKS[build.verdict ?? 'unjudged'].word],
        },
      ],
    };
  });

  protected resize(plotPx: number): void {
    this.plotPx.set(plotPx);
  }

  protected hover(point: PlotPoint | null): void {
    this.cursor.set(point && this.cursorAt(point));
  }

  protected open(point: PlotPoint): void {
    this.choose(this.cursorAt(point));
  }

  protected zoom(part: PlotRange): void {
    this.show(zoomedBuilds(this.range(), part));
  }

  protected restore(): void {
    this.show(this.whole());
  }

  protected answerKey(event: KeyboardEvent): void {
    const moves: Record<string, [number, number]> = {
      ArrowLeft: [-1, 0],
      ArrowRight: [1, 0],
      ArrowUp: [0, 1],
      ArrowDown: [0, -1],
    };
    const move = moves[event.key];
    const cursor = this.cursor();
    if (move) this.moveCursor(move[0], move[1]);
    else if (event.key === 'Enter' && cursor) this.choose(cursor);
    else if (event.key === 'Escape') this.restore();
    else return;
    event.preventDefault();
  }

  private moveCursor(builds: number, cells: number): void {
    const { from, to } = this.range();
    const at = this.cursor() ?? { build: to - 1 - builds, cell: -cells };
    this.cursor.set({
      build: Math.min(to - 1, Math.max(from, at.build + builds)),
      cell: Math.min(this.cellCount() - 1, Math.max(0, at.cell + cells)),
    });
  }

  private choose({ build, cell }: Cursor): void {
    this.cellChosen.emit({
      buildId: this.builds()[build].id,
      fromHz: this.edgesHz()[cell],
      toHz: this.edgesHz()[cell + 1],
      marginDb: this.cells()[build][cell],
    });
  }

  private show(range: BuildRange): void {
    this.range.set(range);
    this.rangeChanged.emit(range);
  }

  /** The cell under a point; where builds share a column, the one whose margin the column shows. */
  private cursorAt({ xFraction, yFraction }: PlotPoint): Cursor {
    const columns = this.columns();
    const column = Math.min(columns - 1, Math.floor(xFraction * columns));
    const cell = Math.min(this.cellCount() - 1, Math.floor((1 - yFraction) * this.cellCount()));
    const { from, to } = columnBuilds(column, columns, this.range());
    let build = from;
    for (let other = from + 1; other < to; other++) {
      if ((this.cells()[other][cell] ?? Infinity) < (this.cells()[build][cell] ?? Infinity)) build = other;
    }
    return { build, cell };
  }

  private standing(marginDb: number): string {
    if (marginDb < 0) return ', over limit';
    return marginDb < this.targetMarginDb() ? ', below target' : '';
  }

  private cellCount(): number {
    return this.edgesHz().length - 1;
  }
}
