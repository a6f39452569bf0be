import { ChangeDetectionStrategy, Component, effect, inject, input, output, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { BenchInput, BenchView } from '@shared/contracts/benches';
import type { Problem } from '@shared/contracts/problem';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { keyOfName } from '../ui/key-of-name';
import { ProblemBanner } from '../ui/problem-banner';

/** A new bench, or what is said of one that exists. */
@Component({
  selector: 'app-bench-form',
  imports: [FieldErrorPipe, MatButton, MatFormFieldModule, MatInput, ProblemBanner, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './bench-form.html',
  styles: `
    .form {
      max-width: 760px;
    }
  `,
})
export class BenchForm {
  /** Null for a new bench. */
  readonly bench = input.required<BenchView | null>();
  readonly isSaving = input.required<boolean>();
  /** What the server said against the last attempt. */
  readonly problem = input.required<Problem | null>();
  readonly saved = output<BenchInput>();
  readonly cancelled = output();

  protected readonly form = inject(NonNullableFormBuilder).group({
    name: ['', [Validators.required, Validators.maxLength(120)]],
    key: ['', [Validators.required, Validators.pattern(/^[a-z0-9][a-z0-9-]{0,62}$/)]],
    location: ['', Validators.maxLength(200)],
    lisn: ['', Validators.maxLength(400)],
    receiver: ['', Validators.maxLength(400)],
    notes: ['', Validators.maxLength(4000)],
  });

  /** Fields that say themselves what the server has against them. */
  protected readonly shownPaths = signal<readonly string[]>([]);

  constructor() {
    effect(() => {
      const bench = this.bench();
      if (bench) this.form.patchValue(bench);
    });
    effect(() => {
      const problem = this.problem();
      this.shownPaths.set(problem ? applyProblem(this.form, namingItsField(problem)) : []);
    });
  }

  /** Proposes the key of a new bench from its name until somebody types a key. */
  protected proposeKey(): void {
    const { key, name } = this.form.controls;
    if (this.bench() === null && !key.dirty) key.setValue(keyOfName(name.value));
  }

  protected save(): void {
    if (this.form.invalid) {
      this.form.markAllAsTouched();
      return;
    }
    this.saved.emit(this.form.getRawValue());
  }
}

/** A conflict over one field comes as "key: the team has a bench ..."; it belongs beside that field. */
function namingItsField(problem: Problem): Problem {
  const [, path, message] = /^(\w+): (.+)$/s.exec(problem.detail) ?? [];
  return problem.errors || path === undefined || message === undefined
    ? problem
    : { ...problem, errors: [{ path, message }] };
}
