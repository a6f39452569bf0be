import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { FormArray, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatInput } from '@angular/material/input';
import { map, startWith, switchMap } from 'rxjs';
import { FieldErrorPipe } from '../ui/field-error';
import { StageControls, stageGroup } from './tags-form';

const MOST_STAGES = 8;

/** Switching frequency of every stage of the build, by which harmonics are followed and named. */
@Component({
  selector: 'app-stages-editor',
  imports: [FieldErrorPipe, MatButton, MatFormFieldModule, MatIcon, MatIconButton, MatInput, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (stage of shown(); track stage; let place = $index) {
      <div class="stage" [formGroup]="stage">
        <mat-form-field>
          <mat-label>Stage</mat-label>
          <input matInput formControlName="stage" placeholder="PFC" />
          <mat-error>{{ stage.controls.stage | fieldError }}</mat-error>
        </mat-form-field>
        <button mat-icon-button type="button" [attr.aria-label]="'Remove stage ' + (place + 1)" (click)="remove(place)">
          <mat-icon svgIcon="close" />
        </button>
        <mat-form-field>
          <mat-label>Frequency, kHz</mat-label>
          <input matInput type="number" step="any" formControlName="frequencyKhz" />
          <mat-error>{{ stage.controls.frequencyKhz | fieldError }}</mat-error>
        </mat-form-field>
        <mat-form-field>
          <mat-label>Spread, %</mat-label>
          <input matInput type="number" step="any" formControlName="spreadPercent" />
          <mat-error>{{ stage.controls.spreadPercent | fieldError }}</mat-error>
        </mat-form-field>
      </div>
    }
    <div class="acts">
      <button mat-button type="button" [disabled]="shown().length >= most" (click)="add()">
        <mat-icon svgIcon="add" />Add a stage
      </button>
      <ng-content />
    </div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
    }
    .stage {
      display: grid;
      grid-template-columns: 1fr 1fr 40px;
      gap: 8px;
      align-items: start;
    }
    .stage > :first-child {
      grid-column: 1 / 3;
    }
    .acts {
      display: flex;
      flex-wrap: wrap;
      gap: 4px;
    }
  `,
})
export class StagesEditor {
  readonly stages = input.required<FormArray<FormGroup<StageControls>>>();

  protected readonly most = MOST_STAGES;
  /** Follows the form, which the page around it fills as well. */
  protected readonly shown = toSignal(
    toObservable(this.stages).pipe(
      switchMap((stages) =>
        stages.valueChanges.pipe(
          startWith(null),
          map(() => [...stages.controls]),
        ),
      ),
    ),
    { initialValue: [] },
  );

  protected add(): void {
    this.stages().push(stageGroup());
  }

  protected remove(place: number): void {
    this.stages().removeAt(place);
  }
}
