import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { BuildView } from '@shared/contracts/builds';
import { ProductInView } from '../product-in-view';
import { changeRows } from './build-changes';

export interface ComparedBuild {
  role: string;
  build: BuildView;
}

/** What the team declared about the build and about those it is compared with; what differs stands out. */
@Component({
  selector: 'app-changes-table',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame" tabindex="0" role="group" aria-label="Declared changes">
      <table class="dense-table">
        <thead>
          <tr>
            <td></td>
            @for (one of builds(); track one.build.id) {
              <th scope="col">
                {{ one.role }}
                @if (!$last) {
                  <a [routerLink]="view.link().concat('builds', '' + one.build.id)" [queryParams]="view.linkQuery()"
                    >{{ one.build.hardware }} / {{ one.build.firmware }}</a
                  >
                }
              </th>
            }
          </tr>
        </thead>
        <tbody>
          @for (row of rows(); track row.what) {
            <tr [class.different]="row.isDifferent">
              <th scope="row">{{ row.what }}</th>
              @for (cell of row.cells; track $index) {
                <td class="wrap">
                  <span class="number text">{{ cell.text }}</span>
                  @if (cell.note) {
                    <span class="note muted small">{{ cell.note }}</span>
                  }
                </td>
              }
            </tr>
          }
        </tbody>
      </table>
    </div>
    <p class="small muted">What differs is set in bold. Declared by the team with the builds, not measured.</p>
  `,
  styles: `
    :host {
      display: grid;
      gap: 6px;
    }
    th[scope='row'] {
      vertical-align: top;
    }
    thead a {
      text-decoration: underline;
    }
    td.wrap {
      min-width: 150px;
      vertical-align: top;
    }
    .different .text {
      font-weight: 700;
    }
    .note {
      display: block;
    }
  `,
})
export class ChangesTable {
  protected readonly view = inject(ProductInView);

  /** The build in question last. */
  readonly builds = input.required<readonly ComparedBuild[]>();

  protected readonly rows = computed(() => changeRows(this.builds().map(({ build }) => build)));
}
