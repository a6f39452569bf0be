import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { RouterLink } from '@angular/router';
import type { Problem } from '@shared/contracts/problem';
import { switchMap } from 'rxjs';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { AuthFrame } from './auth-frame';
import { PASSWORD_LENGTH } from './password-length';
import { SessionStore } from './session-store';

@Component({
  selector: 'app-reset-password-page',
  imports: [
    AuthFrame,
    FieldErrorPipe,
    MatButton,
    MatFormFieldModule,
    MatInput,
    ProblemBanner,
    ReactiveFormsModule,
    RouterLink,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-auth-frame title="Set a new password">
      @if (done()) {
        <p class="notice" role="status">Your new password is set. Every other session of yours was signed out.</p>
        <p class="links"><a routerLink="/sign-in">Sign in with it</a></p>
      } @else {
        @if (problem(); as problem) {
          <app-problem-banner [problem]="problem" [shownPaths]="['password']">
            <a routerLink="/forgot-password">Ask for a new link</a>
          </app-problem-banner>
        }
        <form class="form" [formGroup]="form" (ngSubmit)="setPassword()">
          <mat-form-field>
            <mat-label>New password</mat-label>
            <input matInput type="password" formControlName="password" autocomplete="new-password" />
            <mat-hint>At least {{ least }} characters; a sentence works well.</mat-hint>
            <mat-error>{{ form.controls.password | fieldError }}</mat-error>
          </mat-form-field>
          <button mat-flat-button type="submit" [disabled]="busy()">Set the password</button>
        </form>
      }
    </app-auth-frame>
  `,
  styleUrl: './auth-form.scss',
})
export class ResetPasswordPage {
  private readonly http = inject(HttpClient);
  private readonly session = inject(SessionStore);
  readonly token = input.required<string>();

  protected readonly least = PASSWORD_LENGTH;
  protected readonly form = inject(NonNullableFormBuilder).group({
    password: ['', [Validators.required, Validators.minLength(PASSWORD_LENGTH)]],
  });
  protected readonly busy = signal(false);
  protected readonly done = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected setPassword(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.session
      .load()
      .pipe(
        switchMap(() =>
          this.http.post(`/api/password-resets/${encodeURIComponent(this.token())}`, this.form.getRawValue()),
        ),
      )
      .subscribe({
        next: () => {
          // The server ended every session of this person, the one of this browser too.
          this.session.forget();
          this.done.set(true);
        },
        error: (error: unknown) => {
          const problem = problemOf(error);
          applyProblem(this.form, problem);
          this.problem.set({ ...problem, advice: problem.advice ?? '' });
          this.busy.set(false);
        },
      });
  }
}
