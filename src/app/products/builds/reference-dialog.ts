import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { Problem } from '@shared/contracts/problem';
import { applyProblem } from '../../ui/apply-problem';
import { FieldErrorPipe } from '../../ui/field-error';
import { problemOf } from '../../ui/problem';
import { ProblemBanner } from '../../ui/problem-banner';

export interface ReferenceDialogData {
  /** Address of the product's reference. */
  url: string;
  team: string;
  /** The build to compare with; null: no single build, but the latest ones judged held. */
  build: { id: number; hardware: string; firmware: string } | null;
}

/** Asks why a build becomes the reference, or why none is; closes with true once it is stored. */
@Component({
  selector: 'app-reference-dialog',
  imports: [
    FieldErrorPipe,
    MatButton,
    MatDialogModule,
    MatFormFieldModule,
    MatInput,
    ProblemBanner,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form [formGroup]="form" (ngSubmit)="choose()">
      <h2 mat-dialog-title>{{ title }}</h2>
      <mat-dialog-content
        ><div class="form">
          @if (problem(); as problem) {
            <app-problem-banner [problem]="problem" kept="The reference is as it was." [shownPaths]="['reason']" />
          }
          <p>
            {{
              data.build
                ? 'Builds after it are judged against this build from now on.'
                : 'Each build is judged against the pooled mean of the latest builds judged held.'
            }}
            Every build of the product is judged anew; drops that the data no longer support are withdrawn, with a line
            in their history.
          </p>
          <mat-form-field>
            <mat-label>Reason</mat-label>
            <textarea
              matInput
              rows="2"
              formControlName="reason"
              placeholder="Release that went to the test house"
              cdkFocusInitial
            ></textarea>
            <mat-hint>Kept with your name and the date.</mat-hint>
            <mat-error>{{ form.controls.reason | fieldError }}</mat-error>
          </mat-form-field>
        </div></mat-dialog-content
      >
      <mat-dialog-actions align="end">
        <button mat-button type="button" mat-dialog-close>Cancel</button>
        <button mat-flat-button type="submit" [disabled]="busy()">Choose as reference</button>
      </mat-dialog-actions>
    </form>
  `,
  styles: `
    .form {
      padding-top: 6px;
    }
  `,
})
export class ReferenceDialog {
  private readonly http = inject(HttpClient);
  private readonly dialog = inject<MatDialogRef<ReferenceDialog, true>>(MatDialogRef);
  protected readonly data = inject<ReferenceDialogData>(MAT_DIALOG_DATA);

  protected readonly title = this.data.build
    ? `Compare with ${this.data.build.hardware} / ${this.data.build.firmware}`
    : 'Compare with builds judged held';
  protected readonly form = inject(NonNullableFormBuilder).group({
    reason: ['', [Validators.required, Validators.minLength(3), Validators.maxLength(400)]],
  });
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected choose(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    const { url, team, build } = this.data;
    const choice = { buildId: build?.id ?? null, ...this.form.getRawValue() };
    this.http.put(url, choice, { params: { team } }).subscribe({
      next: () => this.dialog.close(true),
      error: (error: unknown) => {
        const problem = problemOf(error);
        applyProblem(this.form, problem);
        this.problem.set(problem);
        this.busy.set(false);
      },
    });
  }
}
