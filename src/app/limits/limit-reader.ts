import { ChangeDetectionStrategy, Component, computed, effect, input, output } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { LimitSetView } from '@shared/contracts/limits';
import { limitAt, type LimitLine } from '@shared/limits/limit-line';
import { formatFrequency } from '@shared/units/format-frequency';
import { parseFrequency } from './parse-frequency';

/** Reads the limits of the chosen sets at one frequency. */
@Component({
  selector: 'app-limit-reader',
  imports: [MatFormFieldModule, MatInput, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <mat-form-field>
      <mat-label>Frequency</mat-label>
      <input
        matInput
        autocomplete="off"
        placeholder="156 kHz, 0.5 MHz, 7.21M"
        [formControl]="field"
        (input)="take(false)"
        (keydown.enter)="take(true)"
        (blur)="take(true)"
      />
      <mat-error>Write a frequency such as 156 kHz, 0.5 MHz or 7.21M.</mat-error>
    </mat-form-field>
    <div class="table-frame" tabindex="0" role="group" aria-label="Limits at the frequency">
      <table class="dense-table">
        <caption class="visually-hidden">
          Limits at
          {{
            place()
          }}
        </caption>
        <thead>
          <tr>
            <th scope="col">At {{ place() }}</th>
            @for (detector of detectors(); track detector) {
              <th scope="col" class="number">{{ detector }}, dBµV</th>
            }
          </tr>
        </thead>
        <tbody>
          @for (row of rows(); track row.key) {
            <tr>
              <td class="wrap">{{ row.title }}</td>
              @for (limit of row.limits; track $index) {
                <td class="number">{{ limit }}</td>
              }
            </tr>
          }
        </tbody>
      </table>
    </div>
    <p class="small muted">
      Straight over the logarithm of frequency between the points of a line; where two segments meet, the lower limit
      applies.
    </p>
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
      align-content: start;
    }
    td.wrap {
      min-width: 130px;
    }
  `,
})
export class LimitReader {
  readonly sets = input.required<readonly LimitSetView[]>();
  readonly frequencyHz = input.required<number>();
  readonly frequencyChange = output<number>();

  protected readonly field = new FormControl('', { nonNullable: true });
  protected readonly place = computed(() => formatFrequency(this.frequencyHz()));
  protected readonly detectors = computed(() => [
    ...new Set(this.sets().flatMap(({ lines }) => lines.map(({ detector }) => detector))),
  ]);
  protected readonly rows = computed(() =>
    this.sets().map(({ key, title, lines }) => ({
      key,
      title,
      limits: this.detectors().map((detector) => limitText(lines, detector, this.frequencyHz())),
    })),
  );

  constructor() {
    effect(() => {
      const frequencyHz = this.frequencyHz();
      if (parseFrequency(this.field.value) !== frequencyHz) this.field.setValue(formatFrequency(frequencyHz));
    });
  }

  /** Follows the typing; only a finished text is called wrong. */
  protected take(isFinished: boolean): void {
    const frequencyHz = parseFrequency(this.field.value);
    if (frequencyHz !== null) {
      this.field.setErrors(null);
      if (frequencyHz !== this.frequencyHz()) this.frequencyChange.emit(frequencyHz);
    } else if (isFinished) {
      this.field.setErrors({ frequency: true });
      this.field.markAsTouched();
    }
  }
}

function limitText(lines: LimitSetView['lines'], detector: string, frequencyHz: number): string {
  const line = lines.find((one) => one.detector === detector);
  const limitDbuv = line ? limitAt(line as LimitLine, frequencyHz) : null;
  return limitDbuv === null ? 'no limit' : limitDbuv.toFixed(1);
}
