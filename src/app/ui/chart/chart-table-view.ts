import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { ChartTable } from './chart-table';

const ROWS_AT_A_TIME = 200;

/** The table behind a chart, in its place and at its height. */
@Component({
  selector: 'app-chart-table-view',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame" tabindex="0" [style.max-height.px]="heightPx()" [attr.aria-label]="table().caption">
      <table class="dense-table">
        <caption class="visually-hidden">
          {{
            table().caption
          }}
        </caption>
        <thead>
          <tr>
            @for (column of table().columns; track $index) {
              <th scope="col" [class.number]="column.isNumber">{{ column.label }}</th>
            }
          </tr>
        </thead>
        <tbody>
          @for (row of rows(); track $index) {
            <tr>
              @for (cell of row; track $index) {
                <td [class.number]="table().columns[$index].isNumber">{{ cell }}</td>
              }
            </tr>
          }
        </tbody>
      </table>
      @if (table().rows.length > rows().length) {
        <button mat-button type="button" (click)="showMore()">Show more of {{ table().rows.length }} rows</button>
      }
    </div>
  `,
  styles: `
    .table-frame {
      overflow-y: auto;
    }
    thead th {
      position: sticky;
      top: 0;
      background: var(--sl-surface);
    }
  `,
})
export class ChartTableView {
  readonly table = input.required<ChartTable>();
  readonly heightPx = input(360);

  private readonly shownRows = signal(ROWS_AT_A_TIME);
  protected readonly rows = computed(() => this.table().rows.slice(0, this.shownRows()));

  protected showMore(): void {
    this.shownRows.update((rows) => rows + ROWS_AT_A_TIME);
  }
}
