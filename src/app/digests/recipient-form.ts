import { ChangeDetectionStrategy, Component, inject, input, output, signal, viewChild } from '@angular/core';
import { FormGroupDirective, NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatInput } from '@angular/material/input';
import type { DigestView } from '@shared/contracts/digests';
import type { Problem } from '@shared/contracts/problem';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { DigestSettings } from './digest-settings';

/** Adds an address, of a member or from outside, to those who get the digest. */
@Component({
  selector: 'app-recipient-form',
  imports: [FieldErrorPipe, MatButton, MatFormFieldModule, MatIcon, MatInput, ProblemBanner, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form [formGroup]="form" (ngSubmit)="add()">
      <mat-form-field>
        <mat-label>E-mail</mat-label>
        <input matInput type="email" formControlName="email" autocomplete="off" />
        <mat-hint>Also of people without an account; each mail has a link to unsubscribe.</mat-hint>
        <mat-error>{{ form.controls.email | fieldError }}</mat-error>
      </mat-form-field>
      <mat-form-field>
        <mat-label>Name (optional)</mat-label>
        <input matInput formControlName="name" autocomplete="off" />
        <mat-error>{{ form.controls.name | fieldError }}</mat-error>
      </mat-form-field>
      <button mat-stroked-button type="submit" [disabled]="busy()"><mat-icon svgIcon="add" />Add</button>
    </form>
    @if (problem(); as problem) {
      <app-problem-banner
        [problem]="problem"
        kept="Nobody was added; what you typed is still here."
        [shownPaths]="['email', 'name']"
      />
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
    }
    form {
      display: flex;
      flex-wrap: wrap;
      gap: 8px 12px;
      align-items: flex-start;
    }
    mat-form-field {
      max-width: 400px;
    }
    mat-form-field + mat-form-field {
      max-width: 240px;
    }
    button {
      margin-top: 8px;
    }
  `,
})
export class RecipientForm {
  private readonly settings = inject(DigestSettings);

  readonly team = input.required<string>();
  readonly added = output<DigestView>();

  private readonly formDirective = viewChild.required(FormGroupDirective);
  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', [Validators.required, Validators.email]],
    name: ['', Validators.maxLength(120)],
  });
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected add(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    this.settings.addRecipient(this.team(), this.form.getRawValue()).subscribe({
      next: (digest) => {
        this.busy.set(false);
        this.formDirective().resetForm();
        this.added.emit(digest);
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
