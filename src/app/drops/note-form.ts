import { ChangeDetectionStrategy, Component, inject, input, output, signal, viewChild } from '@angular/core';
import { FormGroupDirective, NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { DropView } from '@shared/contracts/drops';
import type { Problem } from '@shared/contracts/problem';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { DropTriage } from './drop-triage';

/** Adds a note to the history without moving the drop. */
@Component({
  selector: 'app-note-form',
  imports: [FieldErrorPipe, MatButton, MatFormFieldModule, MatInput, ProblemBanner, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="form" [formGroup]="form" (ngSubmit)="add()">
      <mat-form-field>
        <mat-label>Add a note</mat-label>
        <textarea matInput formControlName="text" rows="2"></textarea>
        <mat-error>{{ form.controls.text | fieldError }}</mat-error>
      </mat-form-field>
      @if (problem(); as problem) {
        <app-problem-banner [problem]="problem" kept="What you typed is still here." [shownPaths]="['text']" />
      }
      <div class="form-actions">
        <button mat-stroked-button type="submit" [disabled]="busy()">Add the note</button>
      </div>
    </form>
  `,
})
export class NoteForm {
  private readonly triage = inject(DropTriage);

  readonly drop = input.required<DropView>();
  readonly added = output<DropView>();

  private readonly formDirective = viewChild.required(FormGroupDirective);
  protected readonly form = inject(NonNullableFormBuilder).group({
    text: ['', [Validators.required, Validators.pattern(/\S/), Validators.maxLength(4000)]],
  });
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected add(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    this.triage.note(this.drop().id, this.form.getRawValue().text.trim()).subscribe({
      next: (drop) => {
        this.busy.set(false);
        this.formDirective().resetForm();
        this.added.emit(drop);
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
