import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatInput } from '@angular/material/input';
import { Router, RouterLink } from '@angular/router';
import type { Problem } from '@shared/contracts/problem';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { AuthFrame } from './auth-frame';
import { DemoSignIns } from './demo-sign-ins';
import { SessionStore } from './session-store';

@Component({
  selector: 'app-sign-in-page',
  imports: [
    AuthFrame,
    DemoSignIns,
    FieldErrorPipe,
    MatButton,
    MatFormFieldModule,
    MatIcon,
    MatInput,
    ProblemBanner,
    ReactiveFormsModule,
    RouterLink,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sign-in-page.html',
  styleUrl: './auth-form.scss',
})
export class SignInPage {
  private readonly router = inject(Router);
  protected readonly session = inject(SessionStore);

  /** Where to go afterwards, from the address; only paths of this product are followed. */
  readonly return = input<string>();
  readonly ended = input<string>();

  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', [Validators.required, Validators.email]],
    password: ['', Validators.required],
  });
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected signIn(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    const { email, password } = this.form.getRawValue();
    this.session.signIn(email, password).subscribe({
      next: () => void this.router.navigateByUrl(ownPath(this.return()), { replaceUrl: true }),
      error: (error: unknown) => {
        const problem = problemOf(error);
        applyProblem(this.form, problem);
        this.problem.set(problem);
        this.busy.set(false);
      },
    });
  }

  protected fillIn(signIn: { email: string; password: string }): void {
    this.form.setValue({ email: signIn.email, password: signIn.password });
    this.signIn();
  }
}

function ownPath(path: string | undefined): string {
  return path !== undefined && /^\/(?![/\\])/.test(path) ? path : '/';
}
