import { HttpClient, httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Router, RouterLink } from '@angular/router';
import type { Problem } from '@shared/contracts/problem';
import type { InvitationView } from '@shared/contracts/session';
import { switchMap } from 'rxjs';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { AuthFrame } from './auth-frame';
import { invitationForm } from './invitation-form';
import { PASSWORD_LENGTH } from './password-length';
import { SessionStore } from './session-store';

@Component({
  selector: 'app-invitation-page',
  imports: [
    AuthFrame,
    FieldErrorPipe,
    MatButton,
    MatFormFieldModule,
    MatInput,
    ProblemBanner,
    ReactiveFormsModule,
    RouterLink,
    Skeleton,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './invitation-page.html',
  styleUrl: './auth-form.scss',
})
export class InvitationPage {
  private readonly http = inject(HttpClient);
  private readonly router = inject(Router);
  private readonly session = inject(SessionStore);
  readonly token = input.required<string>();

  private readonly path = computed(() => `/api/invitations/${encodeURIComponent(this.token())}`);
  protected readonly invitation = httpResource<InvitationView>(() => this.path());
  protected readonly invalid = computed(() => {
    const error = this.invitation.error();
    return error ? { advice: 'Ask the lead of the team for a new one.', ...problemOf(error) } : null;
  });

  protected readonly least = PASSWORD_LENGTH;
  protected readonly form = invitationForm();
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected accept({ isKnown }: InvitationView): void {
    if (this.busy() || (!isKnown && this.form.invalid)) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.session
      .load()
      .pipe(
        switchMap(() => this.http.post(this.path(), isKnown ? {} : this.form.getRawValue())),
        switchMap(() => this.session.reload()),
      )
      .subscribe({
        next: ({ person }) => void this.router.navigateByUrl(person ? '/' : '/sign-in'),
        error: (error: unknown) => {
          const problem = problemOf(error);
          applyProblem(this.form, problem);
          this.problem.set(problem);
          this.busy.set(false);
        },
      });
  }
}
