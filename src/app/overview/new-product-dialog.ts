import { HttpClient, httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import type { LimitSetView } from '@shared/contracts/limits';
import type { Problem } from '@shared/contracts/problem';
import type { ProductView } from '@shared/contracts/products';
import { formatDecibels } from '@shared/units/format-decibels';
import { CurrentTeam } from '../session/current-team';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { keyOfName } from '../ui/key-of-name';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';

/** Asks for what a product cannot be without; closes with the key of the new one. */
@Component({
  selector: 'app-new-product-dialog',
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
  templateUrl: './new-product-dialog.html',
  styles: `
    .form {
      padding-top: 6px;
    }
  `,
})
export class NewProductDialog {
  private readonly http = inject(HttpClient);
  private readonly dialog = inject<MatDialogRef<NewProductDialog, string>>(MatDialogRef);
  private readonly teamKey = inject<{ teamKey: string }>(MAT_DIALOG_DATA).teamKey;

  protected readonly limits = httpResource<LimitSetView[]>(() => '/api/v1/limits', { defaultValue: [] });
  protected readonly teamTarget = formatDecibels(inject(CurrentTeam).targetMarginDb());
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly fields = ['name', 'key', 'limitSetKey', 'targetMarginDb', 'description'] as const;
  protected readonly form = inject(NonNullableFormBuilder).group({
    name: ['', [Validators.required, Validators.maxLength(120)]],
    key: ['', [Validators.required, Validators.pattern(/^[a-z0-9][a-z0-9-]{0,62}$/)]],
    limitSetKey: ['', Validators.required],
    targetMarginDb: [null as number | null, [Validators.min(0), Validators.max(40)]],
    description: ['', Validators.maxLength(4000)],
  });

  /** The key follows the name until somebody writes one. */
  protected followName(): void {
    const { name, key } = this.form.controls;
    if (key.pristine) key.setValue(keyOfName(name.value));
  }

  protected create(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    this.http
      .post<ProductView>('/api/v1/products', this.form.getRawValue(), { params: { team: this.teamKey } })
      .subscribe({
        next: ({ key }) => this.dialog.close(key),
        error: (error: unknown) => {
          const problem = problemOf(error);
          applyProblem(this.form, problem);
          this.problem.set(problem);
          this.busy.set(false);
        },
      });
  }
}
