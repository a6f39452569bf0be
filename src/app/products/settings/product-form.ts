import { HttpClient, httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import { MatSnackBar } from '@angular/material/snack-bar';
import type { LimitSetView } from '@shared/contracts/limits';
import type { Problem } from '@shared/contracts/problem';
import type { ProductView } from '@shared/contracts/products';
import { CurrentTeam } from '../../session/current-team';
import { applyProblem } from '../../ui/apply-problem';
import { DecibelsPipe } from '../../ui/decibels';
import { FieldErrorPipe } from '../../ui/field-error';
import { problemOf } from '../../ui/problem';
import { ProblemBanner } from '../../ui/problem-banner';
import { ProductInView } from '../product-in-view';

/** Name, description, limit plan and target margin. */
@Component({
  selector: 'app-product-form',
  imports: [
    DecibelsPipe,
    FieldErrorPipe,
    MatButton,
    MatFormFieldModule,
    MatInput,
    MatSelectModule,
    ProblemBanner,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './product-form.html',
  styleUrl: './sheet.scss',
})
export class ProductForm {
  private readonly http = inject(HttpClient);
  private readonly snackBar = inject(MatSnackBar);
  protected readonly view = inject(ProductInView);

  readonly product = input.required<ProductView>();

  protected readonly limits = httpResource<LimitSetView[]>(() => '/api/v1/limits', { defaultValue: [] });
  protected readonly teamTargetDb = inject(CurrentTeam).targetMarginDb;
  /** Their margins are to the present limit, so that it stays. */
  protected readonly hasSweeps = computed(() => this.product().lines.length > 0);
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly fields = ['name', 'description', 'limitSetKey', 'targetMarginDb'] as const;
  protected readonly form = inject(NonNullableFormBuilder).group({
    name: ['', [Validators.required, Validators.maxLength(120)]],
    description: ['', Validators.maxLength(4000)],
    limitSetKey: ['', Validators.required],
    targetMarginDb: [null as number | null, [Validators.min(0), Validators.max(40)]],
  });

  constructor() {
    effect(() => {
      const { name, description, limitSetKey, ownTargetMarginDb: targetMarginDb } = this.product();
      if (!this.form.dirty) this.form.setValue({ name, description, limitSetKey, targetMarginDb });
      if (this.view.may('products.edit')) this.form.enable({ emitEvent: false });
      else this.form.disable({ emitEvent: false });
      if (this.hasSweeps()) this.form.controls.limitSetKey.disable({ emitEvent: false });
    });
  }

  protected limitTitle(sets: readonly LimitSetView[]): string {
    return sets.find(({ key }) => key === this.product().limitSetKey)?.title ?? this.product().limitSetKey;
  }

  protected save(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    this.http.patch(this.view.api(), this.form.getRawValue(), { params: this.view.apiTeam() }).subscribe({
      next: () => {
        this.busy.set(false);
        this.form.markAsPristine();
        this.view.reload();
        this.snackBar.open('The product is saved.', undefined, { duration: 4000 });
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
