import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
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
import { SessionStore } from './session-store';

@Component({
  selector: 'app-forgot-password-page',
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
    <app-auth-frame title="Forgot your password?" lead="We send you a link to set a new one.">
      @if (sentTo(); as email) {
        <p class="notice" role="status">
          If {{ email }} has a sign-in here, a link is on its way. It works once and for a limited time.
        </p>
      } @else {
        @if (problem(); as problem) {
          <app-problem-banner [problem]="problem" kept="What you typed is still here." [shownPaths]="['email']" />
        }
        <form class="form" [formGroup]="form" (ngSubmit)="send()">
          <mat-form-field>
            <mat-label>E-mail</mat-label>
            <input matInput type="email" formControlName="email" autocomplete="username" />
            <mat-error>{{ form.controls.email | fieldError }}</mat-error>
          </mat-form-field>
          <button mat-flat-button type="submit" [disabled]="busy()">Send the link</button>
        </form>
      }
      <p class="links"><a routerLink="/sign-in">Back to sign in</a></p>
    </app-auth-frame>
  `,
  styleUrl: './auth-form.scss',
})
export class ForgotPasswordPage {
  private readonly http = inject(HttpClient);
  private readonly session = inject(SessionStore);
  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', [Validators.required, Validators.email]],
  });
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly sentTo = signal('');

  protected send(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    const { email } = this.form.getRawValue();
    this.session
      .load()
      .pipe(switchMap(() => this.http.post('/api/password-resets', { email }, { responseType: 'text' })))
      .subscribe({
        next: () => this.sentTo.set(email),
        error: (error: unknown) => {
          const problem = problemOf(error);
          applyProblem(this.form, problem);
          this.problem.set(problem);
          this.busy.set(false);
        },
      });
  }
}
