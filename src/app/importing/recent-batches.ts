import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { ImportBatchView } from '@shared/contracts/imports';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { TimeStamp } from '../ui/time-stamp';

/** The last imports of the team by page. */
@Component({
  selector: 'app-recent-batches',
  imports: [ProblemBanner, RouterLink, Skeleton, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2>Recent imports</h2>
    @if (problem(); as problem) {
      <app-problem-banner [problem]="problem" />
    } @else if (batches.hasValue()) {
      @if (batches.value().length === 0) {
        <p class="muted">None yet. Sweeps that benches send by themselves are in the list of sweeps.</p>
      } @else {
        <div class="table-frame">
          <table class="dense-table">
            <thead>
              <tr>
                <th scope="col">Import</th>
                <th scope="col">When</th>
                <th scope="col">By</th>
                <th scope="col" class="number">Imported</th>
                <th scope="col" class="number">Duplicate</th>
                <th scope="col" class="number">Refused</th>
                <th scope="col" class="number">Waiting</th>
              </tr>
            </thead>
            <tbody>
              @for (batch of batches.value(); track batch.id) {
                <tr>
                  <td>
                    <a [routerLink]="['/t', team(), 'import', batch.id]">No. {{ batch.id }}</a>
                  </td>
                  <td><app-time [at]="batch.createdAt" /></td>
                  <td>{{ batch.createdBy }}</td>
                  <td class="number">{{ batch.imported }}</td>
                  <td class="number">{{ batch.duplicate }}</td>
                  <td class="number" [class.refused]="batch.refused > 0">{{ batch.refused }}</td>
                  <td class="number">{{ batch.waiting }}</td>
                </tr>
              }
            </tbody>
          </table>
        </div>
      }
    } @else {
      <app-skeleton label="Loading recent imports" [lines]="3" />
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
    }
    .refused {
      color: var(--sl-lost);
      font-weight: 500;
    }
  `,
})
export class RecentBatches {
  readonly team = input.required<string>();

  protected readonly batches = httpResource<ImportBatchView[]>(
    () => `/api/teams/${encodeURIComponent(this.team())}/imports`,
  );
  protected readonly problem = computed(() => {
    const error = this.batches.error();
    return error ? problemOf(error) : null;
  });
}
