import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { SweepView } from '@shared/contracts/sweeps';
import { FrequencyPipe } from '../../ui/frequency';
import { MarginValue } from '../../ui/margin-value';
import { TimeStamp } from '../../ui/time-stamp';
import { ProductInView } from '../product-in-view';

const FIRST_ROWS = 12;

/** The sweeps a build was measured with, the least margin first. */
@Component({
  selector: 'app-sweep-list',
  imports: [FrequencyPipe, MarginValue, MatButton, RouterLink, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame">
      <table class="dense-table">
        <thead>
          <tr>
            <th scope="col">Sweep</th>
            <th scope="col">Operating state</th>
            <th scope="col">Line</th>
            <th scope="col">Detector</th>
            <th scope="col" class="number">Worst margin</th>
            <th scope="col" class="number">at</th>
            <th scope="col">Unit</th>
            <th scope="col">Bench</th>
            <th scope="col">Run</th>
            <th scope="col">Taken</th>
            <th scope="col" class="number">Remarks</th>
          </tr>
        </thead>
        <tbody>
          @for (sweep of rows(); track sweep.id) {
            <tr>
              <td>
                <a [routerLink]="['/t', view.team(), 'sweeps', sweep.id]">{{ sweep.id }}</a>
              </td>
              <td>{{ sweep.state }}</td>
              <td>{{ sweep.line }}</td>
              <td>{{ sweep.detector }}</td>
              <td class="number">
                <app-margin-value [marginDb]="sweep.worst?.marginDb ?? null" [targetMarginDb]="targetMarginDb()" />
              </td>
              <td class="number">{{ sweep.worst?.frequencyHz | frequency }}</td>
              <td>{{ sweep.unit }}</td>
              <td>{{ sweep.bench }}</td>
              <td>{{ sweep.run }}</td>
              <td><app-time [at]="sweep.takenAt" /></td>
              <td class="number">{{ sweep.remarks.length || '' }}</td>
            </tr>
          }
        </tbody>
      </table>
    </div>
    @if (sweeps().length > rows().length) {
      <button mat-button type="button" (click)="isAll.set(true)">Show all {{ sweeps().length }} sweeps</button>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
      justify-items: start;
    }
    .table-frame {
      width: 100%;
    }
  `,
})
export class SweepList {
  protected readonly view = inject(ProductInView);

  readonly sweeps = input.required<readonly SweepView[]>();
  readonly targetMarginDb = input.required<number>();

  protected readonly isAll = signal(false);
  protected readonly rows = computed(() => {
    const marginOf = ({ worst }: SweepView) => worst?.marginDb ?? Infinity;
    const sorted = [...this.sweeps()].sort((a, b) => marginOf(a) - marginOf(b));
    return this.isAll() ? sorted : sorted.slice(0, FIRST_ROWS);
  });
}
