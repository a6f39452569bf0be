import { ChangeDetectionStrategy, Component, inject, output, signal, viewChild } from '@angular/core';
import { FormGroupDirective, NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { Problem } from '@shared/contracts/problem';
import type { InstallationTeam } from '@shared/contracts/teams';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { InstallationStore } from './installation-store';

/** Name, key and zone of a new team. */
@Component({
  selector: 'app-team-form',
  imports: [FieldErrorPipe, MatButton, MatFormFieldModule, MatInput, ProblemBanner, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form [formGroup]="form" (ngSubmit)="create()">
      <div class="form-row">
        <mat-form-field>
          <mat-label>Name</mat-label>
          <input matInput formControlName="name" autocomplete="off" />
          <mat-error>{{ form.controls.name | fieldError }}</mat-error>
        </mat-form-field>
        <mat-form-field>
          <mat-label>Key</mat-label>
          <input matInput formControlName="key" autocomplete="off" />
          <mat-hint>Stands in addresses and stays: small letters, digits, hyphens.</mat-hint>
          <mat-error>{{ form.controls.key | fieldError }}</mat-error>
        </mat-form-field>
        <mat-form-field>
          <mat-label>Time zone</mat-label>
          <input matInput formControlName="timeZone" list="new-team-zones" autocomplete="off" />
          <mat-error>{{ form.controls.timeZone | fieldError }}</mat-error>
        </mat-form-field>
        <datalist id="new-team-zones">
          @for (zone of zones; track zone) {
            <option [value]="zone"></option>
          }
        </datalist>
      </div>
      @if (problem(); as problem) {
        <app-problem-banner
          [problem]="problem"
          kept="No team was made; what you typed is still here."
          [shownPaths]="['name', 'key', 'timeZone']"
        />
      }
      <div class="form-actions">
        <button mat-flat-button type="submit" [disabled]="busy()">Make the team</button>
      </div>
    </form>
  `,
  styles: `
    form {
      display: grid;
      gap: 12px;
      max-width: 900px;
    }
  `,
})
export class TeamForm {
  private readonly store = inject(InstallationStore);

  readonly created = output<InstallationTeam>();

  private readonly formDirective = viewChild.required(FormGroupDirective);
  protected readonly zones = Intl.supportedValuesOf('timeZone');
  private readonly ownZone = Intl.DateTimeFormat().resolvedOptions().timeZone;
  protected readonly form = inject(NonNullableFormBuilder).group({
    name: ['', [Validators.required, Validators.pattern(/\S/), Validators.maxLength(120)]],
    key: ['', [Validators.required, Validators.pattern(/^[a-z0-9][a-z0-9-]{0,62}$/)]],
    timeZone: [this.ownZone, Validators.required],
  });
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected create(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    const { name, key, timeZone } = this.form.getRawValue();
    this.store.createTeam({ name: name.trim(), key, timeZone: timeZone.trim() }).subscribe({
      next: (team) => {
        this.busy.set(false);
        this.formDirective().resetForm({ name: '', key: '', timeZone });
        this.created.emit(team);
      },
      error: (error: unknown) => {
        const problem = problemOf(error);
        applyProblem(this.form, problem);
        this.problem.set(problem);
        this.busy.set(false);
      },
    });
  }
}
