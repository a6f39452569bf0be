import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatCheckbox } from '@angular/material/checkbox';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { Problem } from '@shared/contracts/problem';
import type { StateView } from '@shared/contracts/products';
import { applyProblem } from '../../ui/apply-problem';
import { FieldErrorPipe } from '../../ui/field-error';
import { problemOf } from '../../ui/problem';
import { ProblemBanner } from '../../ui/problem-banner';

export interface StateDialogData {
  /** Address of the product's states. */
  url: string;
  team: string;
  /** The state to change; absent: a new one. */
  state?: StateView;
}

/** Adds or changes an operating state; closes with it. */
@Component({
  selector: 'app-state-dialog',
  imports: [
    FieldErrorPipe,
    MatButton,
    MatCheckbox,
    MatDialogModule,
    MatFormFieldModule,
    MatInput,
    ProblemBanner,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './state-dialog.html',
  styles: `
    .form {
      padding-top: 6px;
    }
  `,
})
export class StateDialog {
  private readonly http = inject(HttpClient);
  private readonly dialog = inject<MatDialogRef<StateDialog, StateView>>(MatDialogRef);
  protected readonly data = inject<StateDialogData>(MAT_DIALOG_DATA);

  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly shownPaths = signal<readonly string[]>([]);
  protected readonly form = inject(NonNullableFormBuilder).group({
    name: [this.data.state?.name ?? '', [Validators.required, Validators.maxLength(120)]],
    supplyVoltageV: [this.data.state?.supplyVoltageV ?? null, [Validators.min(0), Validators.max(2000)]],
    supplyFrequencyHz: [this.data.state?.supplyFrequencyHz ?? null, [Validators.min(0), Validators.max(1000)]],
    load: [this.data.state?.load ?? '', Validators.maxLength(120)],
    mode: [this.data.state?.mode ?? '', Validators.maxLength(120)],
    isRequired: [this.data.state?.isRequired ?? true],
  });

  protected save(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    const { url, team, state } = this.data;
    const values = this.form.getRawValue();
    const request = state
      ? this.http.patch<StateView>(`${url}/${state.id}`, values, { params: { team } })
      : this.http.post<StateView>(url, values, { params: { team } });
    request.subscribe({
      next: (saved) => this.dialog.close(saved),
      error: (error: unknown) => {
        const problem = problemOf(error);
        this.shownPaths.set(applyProblem(this.form, problem));
        this.problem.set(problem);
        this.busy.set(false);
      },
    });
  }
}
