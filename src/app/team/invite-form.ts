import { ChangeDetectionStrategy, Component, inject, input, output, signal, viewChild } from '@angular/core';
import { FormGroupDirective, NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatInput } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import { type Role, ROLES } from '@shared/access/roles';
import type { Problem } from '@shared/contracts/problem';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { ROLE_WORDS } from './role-words';
import { TeamAccess } from './team-access';

/** Invites somebody by e-mail, with an account here or without. */
@Component({
  selector: 'app-invite-form',
  imports: [
    FieldErrorPipe,
    MatButton,
    MatFormFieldModule,
    MatIcon,
    MatInput,
    MatSelectModule,
    ProblemBanner,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form [formGroup]="form" (ngSubmit)="invite()">
      <mat-form-field class="email">
        <mat-label>E-mail</mat-label>
        <input matInput type="email" formControlName="email" autocomplete="off" />
        <mat-hint>A link by mail, good for seven days.</mat-hint>
        <mat-error>{{ form.controls.email | fieldError }}</mat-error>
      </mat-form-field>
      <mat-form-field class="role">
        <mat-label>Role</mat-label>
        <mat-select formControlName="role">
          @for (role of roles; track role) {
            <mat-option [value]="role">{{ role }}</mat-option>
          }
        </mat-select>
        <mat-hint>{{ words[form.getRawValue().role] }}</mat-hint>
      </mat-form-field>
      <button mat-flat-button type="submit" [disabled]="busy()"><mat-icon svgIcon="invite" />Invite</button>
    </form>
    @if (problem(); as problem) {
      <app-problem-banner
        [problem]="problem"
        kept="Nobody was invited; what you typed is still here."
        [shownPaths]="['email', 'role']"
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
    .email {
      max-width: 340px;
    }
    .role {
      max-width: 380px;
    }
    button {
      margin-top: 8px;
    }
  `,
})
export class InviteForm {
  private readonly access = inject(TeamAccess);
  private readonly builder = inject(NonNullableFormBuilder);

  readonly team = input.required<string>();
  readonly invited = output<string>();

  private readonly formDirective = viewChild.required(FormGroupDirective);
  protected readonly form = this.builder.group({
    email: ['', [Validators.required, Validators.email]],
    role: this.builder.control<Role>('viewer'),
  });
  protected readonly roles = ROLES;
  protected readonly words = ROLE_WORDS;
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected invite(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    const invitation = this.form.getRawValue();
    this.access.invite(this.team(), invitation).subscribe({
      next: () => {
        this.busy.set(false);
        this.formDirective().resetForm({ email: '', role: invitation.role });
        this.invited.emit(invitation.email);
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
