import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { DROP_STATE_WORDS } from '@shared/contracts/drop-states';
import type { DropSummary } from '@shared/contracts/drops';
import { MarginValue } from '../../ui/margin-value';
import { SignedDecibelsPipe } from '../../ui/signed-decibels';
import { ProductInView } from '../product-in-view';

/** The drops of a build, each with its sentence, state and owner. */
@Component({
  selector: 'app-drop-list',
  imports: [MarginValue, RouterLink, SignedDecibelsPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame">
      <table class="dense-table">
        <thead>
          <tr>
            <th scope="col">Drop</th>
            <th scope="col" class="wide-only">Operating state</th>
            <th scope="col" class="wide-only">Band</th>
            <th scope="col" class="number wide-only">Change</th>
            <th scope="col" class="number">Margin left</th>
            <th scope="col" class="wide-only">State</th>
            <th scope="col" class="wide-only">Owner</th>
          </tr>
        </thead>
        <tbody>
          @for (drop of drops(); track drop.id) {
            <tr>
              <td class="wrap">
                @if (view.isShared()) {
                  {{ drop.sentence }}
                } @else {
                  <a [routerLink]="['/t', view.team(), 'drops', drop.id]">{{ drop.sentence }}</a>
                }
                <span class="narrow-only small muted"
                  >{{ drop.operatingState }}, {{ drop.band }}; {{ words[drop.state] }},
                  {{ drop.owner?.name ?? 'nobody yet' }}</span
                >
              </td>
              <td class="wide-only">{{ drop.operatingState }}</td>
              <td class="wide-only">{{ drop.band }}</td>
              <td class="number wide-only">{{ drop.differenceDb | signedDecibels }}</td>
              <td class="number">
                <app-margin-value [marginDb]="drop.marginDb" [targetMarginDb]="targetMarginDb()" />
              </td>
              <td class="wide-only">{{ words[drop.state] }}</td>
              <td class="wide-only">{{ drop.owner?.name ?? 'nobody yet' }}</td>
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
    .dense-table td.wrap {
      min-width: 320px;
    }
    .narrow-only {
      display: none;
    }
    @media (max-width: 839.98px) {
      .wide-only {
        display: none;
      }
      .narrow-only {
        display: block;
      }
      .dense-table td.wrap {
        min-width: 190px;
      }
    }
    a {
      font-weight: 400;
    }
  `,
})
export class DropList {
  protected readonly view = inject(ProductInView);
  protected readonly words = DROP_STATE_WORDS;

  readonly drops = input.required<readonly DropSummary[]>();
  readonly targetMarginDb = input.required<number>();
}
