import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { DropEvidence } from '@shared/contracts/drops';

/** What both sides were measured with, row by row; a difference is marked by glyph, word and ground. */
@Component({
  selector: 'app-set-up-table',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h3>{{ heading() }}</h3>
    <div class="table-frame">
      <table class="dense-table">
        <thead>
          <tr>
            <th scope="col">Set-up</th>
            <th scope="col">Reference</th>
            <th scope="col">This build</th>
            <th scope="col"><span class="visually-hidden">Difference</span></th>
          </tr>
        </thead>
        <tbody>
          @for (row of rows(); track row.what) {
            <tr [class.differs]="row.isDifferent">
              <th scope="row">{{ row.what }}</th>
              <td class="wrap">{{ row.reference }}</td>
              <td class="wrap">{{ row.build }}</td>
              <td>
                @if (row.isDifferent) {
                  <span class="mark"><mat-icon class="inline-icon" svgIcon="over" />differs</span>
                }
              </td>
            </tr>
          }
        </tbody>
      </table>
    </div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 6px;
    }
    .table-frame {
      position: relative;
    }
    .dense-table:not(.mat-mdc-table) tbody th {
      height: auto;
      font-size: 13px;
      font-weight: 400;
    }
    td,
    tbody th {
      padding-block: 4px;
    }
    .differs {
      background: var(--sl-unsure-ground);
    }
    .mark {
      color: var(--sl-unsure);
      font-weight: 500;
    }
    @media (max-width: 719px) {
      td.wrap {
        min-width: 100px;
      }
      td,
      tbody th {
        padding-inline: 8px;
      }
      tbody th {
        white-space: normal;
      }
    }
  `,
})
export class SetUpTable {
  readonly rows = input.required<DropEvidence['setUp']>();

  protected readonly heading = computed(() => {
    const differing = this.rows().filter(({ isDifferent }) => isDifferent).length;
    if (differing === 0) return 'Both sides were measured alike';
    return `The set-up differs in ${differing} ${differing === 1 ? 'row' : 'rows'}`;
  });
}
