import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, inject, signal, viewChild } from '@angular/core';
import { FormGroupDirective, NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSnackBar } from '@angular/material/snack-bar';
import { Router } from '@angular/router';
import type { Problem } from '@shared/contracts/problem';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { PASSWORD_LENGTH } from './password-length';
import { SessionStore } from './session-store';

@Component({
  selector: 'app-account-page',
  imports: [FieldErrorPipe, MatButton, MatFormFieldModule, MatInput, PageHeader, ProblemBanner, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './account-page.html',
  styleUrl: './account-page.scss',
})
export class AccountPage {
  private readonly http = inject(HttpClient);
  private readonly router = inject(Router);
  private readonly snackBar = inject(MatSnackBar);
  protected readonly session = inject(SessionStore);

  private readonly formDirective = viewChild.required(FormGroupDirective);
  protected readonly form = inject(NonNullableFormBuilder).group({
    current: ['', Validators.required],
    next: ['', [Validators.required, Validators.minLength(PASSWORD_LENGTH)]],
  });
  protected readonly least = PASSWORD_LENGTH;
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected changePassword(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    this.http.post('/api/account/password', this.form.getRawValue()).subscribe({
      next: () => {
        this.busy.set(false);
        this.formDirective().resetForm();
        this.snackBar.open('Your password is changed.', undefined, { duration: 5000 });
      },
      error: (error: unknown) => this.fail(error),
    });
  }

  protected signOutEverywhere(): void {
    this.busy.set(true);
    this.session.signOutEverywhere().subscribe({
      next: () => void this.router.navigateByUrl('/sign-in'),
      error: (error: unknown) => this.fail(error),
    });
  }

  private fail(error: unknown): void {
    const problem = problemOf(error);
    applyProblem(this.form, problem);
    this.problem.set(problem);
    this.busy.set(false);
  }
}
