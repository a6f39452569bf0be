import { httpResource } from '@angular/common/http';
import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
  output,
  signal,
} from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatRadioModule } from '@angular/material/radio';
import { MatSelectModule } from '@angular/material/select';
import type { BuildSummary } from '@shared/contracts/builds';
import type { DropView } from '@shared/contracts/drops';
import type { Problem } from '@shared/contracts/problem';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { DropTriage } from './drop-triage';
import { fixCandidates } from './fix-candidates';
import { moveNeeds, type MoveTarget, moveWords, noteLabel } from './move-needs';

/** The moves the server allows, with what each of them needs. */
@Component({
  selector: 'app-move-form',
  imports: [
    FieldErrorPipe,
    MatButton,
    MatFormFieldModule,
    MatInput,
    MatRadioModule,
    MatSelectModule,
    ProblemBanner,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './move-form.html',
  styles: `
    mat-radio-group {
      display: flex;
      flex-wrap: wrap;
      gap: 0 12px;
      margin-inline-start: -10px;
    }
    .none {
      color: var(--sl-unsure);
      font-size: 13px;
    }
  `,
})
export class MoveForm {
  private readonly triage = inject(DropTriage);
  private readonly builder = inject(NonNullableFormBuilder);

  readonly drop = input.required<DropView>();
  readonly moved = output<DropView>();

  protected readonly form = this.builder.group({
    state: this.builder.control<MoveTarget | null>(null, Validators.required),
    note: ['', Validators.maxLength(4000)],
    fixedByBuildId: this.builder.control<number | null>(null),
  });
  /** The target chosen; a drop that moved asks anew. */
  protected readonly target = linkedSignal<DropView['state'], MoveTarget | null>({
    source: () => this.drop().state,
    computation: () => null,
  });
  protected readonly choices = computed(() =>
    this.drop()
      .moves.filter((move): move is MoveTarget => move !== 'new' && move !== 'withdrawn')
      .map((target) => ({ target, words: moveWords(this.drop().state, target) })),
  );
  protected readonly noteLabel = computed(() => noteLabel(this.drop().state, this.target()));
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  private readonly builds = httpResource<BuildSummary[]>(() => {
    if (this.target() !== 'fixed') return undefined;
    const { product, team } = this.drop();
    return { url: `/api/v1/products/${encodeURIComponent(product)}/builds`, params: { team } };
  });
  protected readonly candidates = computed(() =>
    this.builds.hasValue() ? fixCandidates(this.builds.value(), this.drop().buildId) : undefined,
  );

  protected choose(target: MoveTarget): void {
    const { note, fixedByBuildId } = this.form.controls;
    const needs = moveNeeds(this.drop().state, target);
    note.setValidators([Validators.maxLength(4000), ...(needs.note ? [Validators.required] : [])]);
    fixedByBuildId.setValidators(needs.build ? Validators.required : null);
    note.updateValueAndValidity();
    fixedByBuildId.updateValueAndValidity();
    this.target.set(target);
  }

  protected move(): void {
    const { state, note, fixedByBuildId } = this.form.getRawValue();
    if (this.form.invalid || state === null || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    const fixedBy = state === 'fixed' && fixedByBuildId !== null ? { fixedByBuildId } : {};
    this.triage.move(this.drop().id, { state, note: note.trim(), ...fixedBy }).subscribe({
      next: (drop) => {
        this.busy.set(false);
        this.form.reset();
        this.moved.emit(drop);
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
