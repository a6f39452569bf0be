import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectChange, MatSelectModule } from '@angular/material/select';
import { MatSlideToggle, MatSlideToggleChange } from '@angular/material/slide-toggle';
import type { DigestView } from '@shared/contracts/digests';
import { hourText, nextWords, WEEKDAYS } from './digest-words';

const HOURS = Array.from({ length: 24 }, (_, hour) => hour);

/** Day and hour of the digest, in the team's zone; a lead's choice counts at once. */
@Component({
  selector: 'app-digest-schedule',
  imports: [MatFormFieldModule, MatSelectModule, MatSlideToggle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let digest = this.digest();
    <p class="next">{{ next() }}</p>
    @if (mayManage()) {
      <mat-slide-toggle [checked]="digest.isOn" [disabled]="busy()" (change)="switchOn($event)">
        Send the digest every week
      </mat-slide-toggle>
      <div class="row">
        <mat-form-field>
          <mat-label>Day</mat-label>
          <mat-select
            [value]="digest.weekday"
            [disabled]="busy() || !digest.isOn"
            (selectionChange)="choose('weekday', $event)"
          >
            @for (weekday of weekdays; track weekday) {
              <mat-option [value]="$index + 1">{{ weekday }}</mat-option>
            }
          </mat-select>
        </mat-form-field>
        <mat-form-field>
          <mat-label>Hour</mat-label>
          <mat-select
            [value]="digest.hour"
            [disabled]="busy() || !digest.isOn"
            (selectionChange)="choose('hour', $event)"
          >
            @for (hour of hours; track hour) {
              <mat-option [value]="hour">{{ hourText(hour) }}</mat-option>
            }
          </mat-select>
        </mat-form-field>
      </div>
      <p class="muted small">The zone is the team's, {{ digest.timeZone }}; it is set with the team's settings.</p>
    } @else {
      <p class="muted">Leads of the team choose the day and the hour.</p>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
    }
    .next {
      font-weight: 500;
    }
    .row {
      display: grid;
      grid-template-columns: 1fr 1fr;
      gap: 12px;
      max-width: 380px;
    }
  `,
})
export class DigestSchedule {
  readonly digest = input.required<DigestView>();
  readonly mayManage = input.required<boolean>();
  readonly busy = input.required<boolean>();
  readonly edited = output<{ isOn?: boolean; weekday?: number; hour?: number }>();

  protected readonly weekdays = WEEKDAYS;
  protected readonly hours = HOURS;
  protected readonly hourText = hourText;
  protected readonly next = computed(() => nextWords(this.digest()));

  /** The controls keep showing what the server has; its answer moves them. */
  protected switchOn({ source, checked }: MatSlideToggleChange): void {
    source.checked = this.digest().isOn;
    this.edited.emit({ isOn: checked });
  }

  protected choose(what: 'weekday' | 'hour', { source, value }: MatSelectChange<number>): void {
    source.value = this.digest()[what];
    this.edited.emit({ [what]: value });
  }
}
