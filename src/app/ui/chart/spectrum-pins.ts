import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { FrequencyPipe } from '../frequency';
import { MarginValue } from '../margin-value';
import type { SpectrumReading } from './spectrum-reading';
import type { SpectrumTrace } from './spectrum-types';

export interface SpectrumPin {
  pinHz: number;
  /** Names of harmonics at this frequency. */
  mark: string;
  readings: readonly SpectrumReading[];
}

/** The pinned frequencies under the chart: every trace's level, limit and margin at each. */
@Component({
  selector: 'app-spectrum-pins',
  imports: [FrequencyPipe, MarginValue, MatIcon, MatIconButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame">
      <table class="dense-table">
        <caption class="visually-hidden">
          Pinned frequencies
        </caption>
        <thead>
          <tr>
            <th scope="col">Pin</th>
            <th scope="col">Trace</th>
            <th scope="col" class="number">Frequency</th>
            <th scope="col" class="number">Level, dBµV</th>
            <th scope="col" class="number">Limit, dBµV</th>
            <th scope="col" class="number">Margin</th>
            <th><span class="visually-hidden">Remove</span></th>
          </tr>
        </thead>
        <tbody>
          @for (pin of pins(); track pin.pinHz; let number = $index) {
            @for (reading of pin.readings; track reading.trace.id; let first = $first) {
              <tr>
                <td>
                  @if (first) {
                    <strong class="pin">{{ number + 1 }}</strong> {{ pin.mark }}
                  }
                </td>
                <td>
                  <span class="swatch" [style.background]="colourOf()(reading.trace)"></span>{{ reading.trace.label }}
                </td>
                <td class="number">{{ reading.frequencyHz | frequency }}</td>
                <td class="number">{{ reading.levelDbuv.toFixed(1) }}</td>
                <td class="number">{{ reading.limitDbuv?.toFixed(1) }}</td>
                <td class="number">
                  @if (reading.marginDb !== null) {
                    <app-margin-value [marginDb]="reading.marginDb" />
                  }
                </td>
                <td>
                  @if (first) {
                    <button
                      mat-icon-button
                      type="button"
                      [attr.aria-label]="'Remove pin ' + (number + 1)"
                      (click)="removed.emit(pin.pinHz)"
                    >
                      <mat-icon svgIcon="close" />
                    </button>
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
      display: block;
      margin-top: 8px;
    }
    td {
      padding-block: 2px;
    }
    .pin {
      color: var(--sl-accent);
    }
    .swatch {
      display: inline-block;
      width: 10px;
      height: 10px;
      margin-inline-end: 6px;
      border-radius: 2px;
    }
    button {
      --mat-icon-button-state-layer-size: 28px;
      --mat-icon-button-icon-size: 18px;

      padding: 5px;
    }
  `,
})
export class SpectrumPins {
  readonly pins = input.required<readonly SpectrumPin[]>();
  readonly colourOf = input.required<(trace: SpectrumTrace) => string>();
  readonly removed = output<number>();
}
