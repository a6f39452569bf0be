import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { OverlayTrace } from '@shared/contracts/sweeps';
import { FrequencyPipe } from '../../ui/frequency';
import { MarginValue } from '../../ui/margin-value';
import { TimeStamp } from '../../ui/time-stamp';
import { ProductInView } from '../product-in-view';

/** Where each trace of the picture comes from: whether two of them may be compared shows here. */
@Component({
  selector: 'app-overlay-sweeps',
  imports: [FrequencyPipe, MarginValue, RouterLink, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame">
      <table class="dense-table">
        <caption class="visually-hidden">
          Sweeps in the picture
        </caption>
        <thead>
          <tr>
            <th scope="col">Sweep</th>
            <th scope="col">Build</th>
            <th scope="col">Operating state</th>
            <th scope="col">Line</th>
            <th scope="col">Detector</th>
            <th scope="col" class="number">Worst margin</th>
            <th scope="col" class="number">at</th>
            <th scope="col">Bench</th>
            <th scope="col">Run</th>
            <th scope="col">Taken</th>
          </tr>
        </thead>
        <tbody>
          @for (sweep of sweeps(); track sweep.sweepId) {
            <tr>
              <td>
                <a [routerLink]="['/t', view.team(), 'sweeps', sweep.sweepId]">{{ sweep.sweepId }}</a>
              </td>
              <td>{{ sweep.kind === 'background' ? 'background' : sweep.hardware + ' / ' + sweep.firmware }}</td>
              <td>{{ sweep.state }}</td>
              <td>{{ sweep.line }}</td>
              <td>{{ sweep.detector }}</td>
              <td class="number">
                @if (sweep.kind === 'product') {
                  <app-margin-value [marginDb]="sweep.worst?.marginDb ?? null" [targetMarginDb]="targetMarginDb()" />
                }
              </td>
              <td class="number">{{ sweep.kind === 'product' ? (sweep.worst?.frequencyHz | frequency) : '' }}</td>
              <td>{{ sweep.bench }}</td>
              <td>{{ sweep.run }}</td>
              <td><app-time [at]="sweep.takenAt" /></td>
            </tr>
          }
        </tbody>
      </table>
    </div>
  `,
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
  `,
})
export class OverlaySweeps {
  protected readonly view = inject(ProductInView);

  readonly sweeps = input.required<readonly OverlayTrace[]>();
  readonly targetMarginDb = input.required<number>();
}
