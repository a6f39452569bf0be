import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { TrendView } from '@shared/contracts/margins';
import { FrequencyPipe } from '../../ui/frequency';
import { TimeStamp } from '../../ui/time-stamp';
import { ProductInView } from '../product-in-view';
import { switchingChanges } from './switching-changes';

/** The switching frequencies along the trend: each change with the build that brought it. */
@Component({
  selector: 'app-switching-history',
  imports: [FrequencyPipe, RouterLink, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2>Switching frequencies</h2>
    @if (changes().length > 0) {
      <div class="table-frame" tabindex="0" role="group" aria-label="Switching frequencies">
        <table class="dense-table">
          <thead>
            <tr>
              <th scope="col">Since build</th>
              <th scope="col">Date</th>
              <th scope="col">Stage</th>
              <th scope="col" class="number">Before</th>
              <th scope="col" class="number">Now</th>
            </tr>
          </thead>
          <tbody>
            @for (change of changes(); track change.buildId + change.stage) {
              <tr>
                <td>
                  <a [routerLink]="view.link().concat('builds', '' + change.buildId)" [queryParams]="view.linkQuery()"
                    >{{ change.hardware }} / {{ change.firmware }}</a
                  >
                </td>
                <td><app-time [at]="change.builtAt" detail="day" /></td>
                <td>{{ change.stage }}</td>
                <td class="number">{{ change.fromHz === null ? 'first declared' : (change.fromHz | frequency) }}</td>
                <td class="number">{{ change.toHz | frequency }}</td>
              </tr>
            }
          </tbody>
        </table>
      </div>
    } @else {
      <p class="muted small">
        No build declares its switching frequencies. With them a drop can be traced to a harmonic that moved.
      </p>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
    }
    .table-frame {
      max-width: 720px;
    }
  `,
})
export class SwitchingHistory {
  protected readonly view = inject(ProductInView);

  readonly points = input.required<TrendView['points']>();

  protected readonly changes = computed(() => switchingChanges(this.points()));
}
