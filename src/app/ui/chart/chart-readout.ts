import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

/** What a chart says about the place under the pointer or the keyboard's cursor. */
export interface Readout {
  /** The place itself, px from the chart's left and top edge. */
  xPx: number;
  yPx: number;
  title: string;
  subtitle?: string;
  columns?: readonly string[];
  rows: readonly ReadoutRow[];
}

export interface ReadoutRow {
  colour?: string;
  label: string;
  cells: readonly string[];
  isOver?: boolean;
}

const GAP_PX = 14;

/** A small table beside the pointer that stays inside the chart. */
@Component({
  selector: 'app-chart-readout',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    'aria-live': 'polite',
    '[style.left.px]': 'leftPx()',
    '[style.right.px]': 'rightPx()',
    '[style.top.px]': 'topPx()',
    '[style.bottom.px]': 'bottomPx()',
  },
  template: `
    <p class="title number">{{ readout().title }}</p>
    @if (readout().subtitle) {
      <p class="muted">{{ readout().subtitle }}</p>
    }
    @if (readout().rows.length > 0) {
      <table>
        @if (readout().columns; as columns) {
          <thead>
            <tr>
              <th></th>
              @for (column of columns; track $index) {
                <th scope="col">{{ column }}</th>
              }
            </tr>
          </thead>
        }
        <tbody>
          @for (row of readout().rows; track $index) {
            <tr [class.over]="row.isOver">
              <th scope="row">
                @if (row.colour) {
                  <span class="swatch" [style.background]="row.colour"></span>
                }
                {{ row.label }}
              </th>
              @for (cell of row.cells; track $index) {
                <td class="number">{{ cell }}</td>
              }
            </tr>
          }
        </tbody>
      </table>
    }
  `,
  styles: `
    :host {
      position: absolute;
      z-index: 2;
      max-width: min(460px, 90%);
      padding: 6px 10px;
      border: 1px solid var(--sl-hairline);
      border-radius: 6px;
      background: color-mix(in srgb, var(--sl-surface) 94%, transparent);
      box-shadow: 0 2px 8px color-mix(in srgb, var(--sl-ink) 16%, transparent);
      font-size: 12px;
      line-height: 17px;
      pointer-events: none;
    }
    .title {
      font-size: 13px;
      font-weight: 500;
    }
    table {
      margin-top: 2px;
      border-spacing: 0;
    }
    th {
      font-weight: 400;
      text-align: start;
    }
    thead th {
      color: var(--sl-ink-muted);
      text-align: end;
    }
    td {
      text-align: end;
      white-space: nowrap;
    }
    td,
    thead th {
      padding-inline-start: 12px;
    }
    .over td:last-child {
      color: var(--sl-margin-text-over);
      font-weight: 500;
    }
    .swatch {
      display: inline-block;
      width: 10px;
      height: 10px;
      margin-inline-end: 4px;
      border-radius: 2px;
    }
  `,
})
export class ChartReadout {
  readonly readout = input.required<Readout>();
  readonly chartWidthPx = input.required<number>();
  readonly chartHeightPx = input.required<number>();

  private readonly isLeftHalf = computed(() => this.readout().xPx < this.chartWidthPx() / 2);
  private readonly isUpperHalf = computed(() => this.readout().yPx < this.chartHeightPx() / 2);
  protected readonly leftPx = computed(() => (this.isLeftHalf() ? this.readout().xPx + GAP_PX : null));
  protected readonly rightPx = computed(() =>
    this.isLeftHalf() ? null : this.chartWidthPx() - this.readout().xPx + GAP_PX,
  );
  protected readonly topPx = computed(() => (this.isUpperHalf() ? Math.max(4, this.readout().yPx - 20) : null));
  protected readonly bottomPx = computed(() =>
    this.isUpperHalf() ? null : Math.max(4, this.chartHeightPx() - this.readout().yPx - 20),
  );
}
