import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatCheckbox } from '@angular/material/checkbox';
import { MatIcon } from '@angular/material/icon';
import type { LimitSetView } from '@shared/contracts/limits';
import { FrequencyPipe } from '../ui/frequency';

/** A limit set with its source and every segment of its lines. */
@Component({
  selector: 'app-limit-set-card',
  imports: [FrequencyPipe, MatCheckbox, MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let set = this.set();
    <div class="head">
      <h2>{{ set.title }}</h2>
      <mat-checkbox [checked]="isShown()" (change)="shownChange.emit($event.checked)">In the chart</mat-checkbox>
    </div>
    <dl>
      <dt>Source</dt>
      <dd>{{ set.source }}</dd>
      <dt>Edition</dt>
      <dd>{{ set.edition }}</dd>
      <dt>Key</dt>
      <dd>
        <code>{{ set.key }}</code>, version {{ set.version }}
      </dd>
    </dl>
    <p class="note"><mat-icon class="inline-icon" svgIcon="info" />{{ set.note }}</p>
    <div class="table-frame" tabindex="0" role="group" aria-label="Segments of the limit">
      <table class="dense-table">
        <caption class="visually-hidden">
          Segments of
          {{
            set.title
          }}
        </caption>
        <thead>
          <tr>
            <th scope="col">Detector</th>
            <th scope="col" class="number">From</th>
            <th scope="col" class="number">To</th>
            <th scope="col" class="number">Limit, dBµV</th>
          </tr>
        </thead>
        <tbody>
          @for (line of set.lines; track line.detector) {
            @for (segment of line.segments; track segment.fromHz; let isFirst = $first) {
              <tr>
                <td>{{ isFirst ? line.detector : '' }}</td>
                <td class="number">{{ segment.fromHz | frequency }}</td>
                <td class="number">{{ segment.toHz | frequency }}</td>
                <td class="number">
                  {{ segment.fromDbuv }}
                  @if (segment.fromDbuv !== segment.toDbuv) {
                    to {{ segment.toDbuv }}
                  }
                </td>
              </tr>
            }
          }
        </tbody>
      </table>
    </div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 10px;
      align-content: start;
    }
    .head {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 16px;
      align-items: center;
      justify-content: space-between;
    }
    dl {
      display: grid;
      grid-template-columns: auto 1fr;
      gap: 4px 16px;
      margin: 0;
      font-size: 13px;
      line-height: 18px;
    }
    dt {
      color: var(--sl-ink-muted);
    }
    dd {
      margin: 0;
    }
    .note {
      font-weight: 500;
    }
    .note mat-icon {
      margin-inline-end: 6px;
    }
  `,
})
export class LimitSetCard {
  readonly set = input.required<LimitSetView>();
  readonly isShown = input.required<boolean>();
  readonly shownChange = output<boolean>();
}
