import { ChangeDetectionStrategy, Component, inject, input, output, signal, viewChild } from '@angular/core';
import { FormGroupDirective, NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatCheckbox } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { TOKEN_SCOPES } from '@shared/access/token-scopes';
import type { Problem } from '@shared/contracts/problem';
import type { TokenCreated } from '@shared/contracts/teams';
import { applyProblem } from '../ui/apply-problem';
import { FieldErrorPipe } from '../ui/field-error';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { SCOPE_WORDS } from './scope-words';
import { TeamAccess } from './team-access';

/** Name and scopes of a new token. */
@Component({
  selector: 'app-token-form',
  imports: [FieldErrorPipe, MatButton, MatCheckbox, MatFormFieldModule, MatInput, ProblemBanner, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="form" [formGroup]="form" (ngSubmit)="create()">
      <mat-form-field>
        <mat-label>Name</mat-label>
        <input matInput formControlName="name" autocomplete="off" />
        <mat-hint>Of the bench or the pipeline that will use it.</mat-hint>
        <mat-error>{{ form.controls.name | fieldError }}</mat-error>
      </mat-form-field>
      <fieldset formGroupName="scopes">
        <legend>It may</legend>
        @for (scope of scopes; track scope) {
          <mat-checkbox [formControlName]="scope">
            {{ words[scope] }} <code class="muted">{{ scope }}</code>
          </mat-checkbox>
        }
        @if (isScopeMissing()) {
          <p class="wrong small" role="alert">Choose at least one.</p>
        }
      </fieldset>
      @if (problem(); as problem) {
        <app-problem-banner
          [problem]="problem"
          kept="No token was made; what you typed is still here."
          [shownPaths]="['name']"
        />
      }
      <div class="form-actions">
        <button mat-flat-button type="submit" [disabled]="busy()">Make the token</button>
      </div>
    </form>
  `,
  styles: `
    fieldset {
      display: grid;
      margin: 0 0 0 -10px;
      padding: 0;
      border: 0;
    }
    legend {
      padding: 0 10px;
      color: var(--sl-ink-muted);
      font-size: 13px;
    }
    code {
      font-size: 12px;
    }
    .wrong {
      padding-inline-start: 10px;
      color: var(--sl-lost);
    }
  `,
})
export class TokenForm {
  private readonly access = inject(TeamAccess);
  private readonly builder = inject(NonNullableFormBuilder);

  readonly team = input.required<string>();
  readonly created = output<TokenCreated>();

  private readonly formDirective = viewChild.required(FormGroupDirective);
  protected readonly form = this.builder.group({
    name: ['', [Validators.required, Validators.pattern(/\S/), Validators.maxLength(120)]],
    scopes: this.builder.group({ 'sweeps:write': false, 'results:read': false, 'gate:read': false }),
  });
  protected readonly scopes = TOKEN_SCOPES;
  protected readonly words = SCOPE_WORDS;
  protected readonly busy = signal(false);
  protected readonly wasSent = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected create(): void {
    this.wasSent.set(true);
    const scopes = this.chosen();
    if (this.form.invalid || scopes.length === 0 || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    this.access.createToken(this.team(), { name: this.form.getRawValue().name.trim(), scopes }).subscribe({
      next: (token) => {
        this.busy.set(false);
        this.wasSent.set(false);
        this.formDirective().resetForm();
        this.created.emit(token);
      },
      error: (error: unknown) => {
        const problem = problemOf(error);
        applyProblem(this.form, problem);
        this.problem.set(problem);
        this.busy.set(false);
      },
    });
  }

  protected isScopeMissing(): boolean {
    return this.wasSent() && this.chosen().length === 0;
  }

  private chosen() {
    const { scopes } = this.form.getRawValue();
    return TOKEN_SCOPES.filter((scope) => scopes[scope]);
  }
}
