import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import { type Role, ROLES } from '@shared/access/roles';
import type { Problem } from '@shared/contracts/problem';
import type { InstallationTeam } from '@shared/contracts/teams';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { InstallationStore } from './installation-store';

/** Invites somebody into a team, its first lead to begin with; closes with the address invited. */
@Component({
  selector: 'app-invite-dialog',
  imports: [
    FieldErrorPipe,
    MatButton,
    MatDialogModule,
    MatFormFieldModule,
    MatInput,
    MatSelectModule,
    ProblemBanner,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title>Invite into {{ team.name }}</h2>
    <form [formGroup]="form" (ngSubmit)="invite()">
      <mat-dialog-content class="form">
        <mat-form-field>
          <mat-label>E-mail</mat-label>
          <input matInput type="email" formControlName="email" autocomplete="off" cdkFocusInitial />
          <mat-error>{{ form.controls.email | fieldError }}</mat-error>
        </mat-form-field>
        <mat-form-field>
          <mat-label>Role</mat-label>
          <mat-select formControlName="role">
            @for (role of roles; track role) {
              <mat-option [value]="role">{{ role }}</mat-option>
            }
          </mat-select>
        </mat-form-field>
        @if (problem(); as problem) {
          <app-problem-banner [problem]="problem" kept="Nobody was invited." [shownPaths]="['email', 'role']" />
        }
      </mat-dialog-content>
      <mat-dialog-actions align="end">
        <button mat-button type="button" mat-dialog-close>Cancel</button>
        <button mat-flat-button type="submit" [disabled]="busy()">Invite</button>
      </mat-dialog-actions>
    </form>
  `,
  styles: `
    .form {
      padding-top: 8px;
    }
  `,
})
export class InviteDialog {
  private readonly store = inject(InstallationStore);
  private readonly builder = inject(NonNullableFormBuilder);
  private readonly dialog = inject<MatDialogRef<InviteDialog, string>>(MatDialogRef);
  protected readonly team = inject<InstallationTeam>(MAT_DIALOG_DATA);

  protected readonly form = this.builder.group({
    email: ['', [Validators.required, Validators.email]],
    role: this.builder.control<Role>('lead'),
  });
  protected readonly roles = ROLES;
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
    this.store.invite(this.team.key, invitation).subscribe({
      next: () => this.dialog.close(invitation.email),
      error: (error: unknown) => {
        const problem = problemOf(error);
        applyProblem(this.form, problem);
        this.problem.set(problem);
        this.busy.set(false);
      },
    });
  }
}
