import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatInput } from '@angular/material/input';
import type { BuildInput, BuildView } from '@shared/contracts/builds';
import type { Problem } from '@shared/contracts/problem';
import { applyProblem } from '../../ui/apply-problem';
import { FieldErrorPipe } from '../../ui/field-error';
import { problemOf } from '../../ui/problem';
import { ProblemBanner } from '../../ui/problem-banner';
import { TEAM_TIME_ZONE } from '../../ui/team-time-zone';
import { buildForm, buildInput } from './build-form';

export interface BuildDialogData {
  /** Address of the product's builds. */
  url: string;
  team: string;
  /** The build to change; absent: a new one. */
  build?: BuildView;
}

/** Adds a build or changes what is known of one; closes with the build. */
@Component({
  selector: 'app-build-dialog',
  imports: [
    FieldErrorPipe,
    MatButton,
    MatDialogModule,
    MatFormFieldModule,
    MatIcon,
    MatIconButton,
    MatInput,
    ProblemBanner,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './build-dialog.html',
  styleUrl: './build-dialog.scss',
})
export class BuildDialog {
  private readonly http = inject(HttpClient);
  private readonly dialog = inject<MatDialogRef<BuildDialog, BuildView>>(MatDialogRef);
  protected readonly timeZone = inject(TEAM_TIME_ZONE)();
  protected readonly data = inject<BuildDialogData>(MAT_DIALOG_DATA);

  protected readonly title = this.data.build
    ? `Change build ${this.data.build.hardware} / ${this.data.build.firmware}`
    : 'Add a build';
  private readonly parts = buildForm(this.data.build, Date.now(), this.timeZone);
  protected readonly form = this.parts.form;
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly shownPaths = signal<readonly string[]>([]);

  protected addStage(): void {
    this.parts.addStage();
  }

  protected addParameter(): void {
    this.parts.addParameter();
  }

  protected save(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    const { url, team, build } = this.data;
    const input = buildInput(this.form, this.timeZone);
    const request = build
      ? this.http.patch<BuildView>(`${url}/${build.id}`, this.changes(input), { params: { team } })
      : this.http.post<BuildView>(url, input, { params: { team } });
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

  /** The field holds whole minutes: a date that nobody touched stays what it was. */
  private changes({ hardware: _hardware, firmware: _firmware, builtAt, ...details }: BuildInput): Partial<BuildInput> {
    return { ...details, ...(this.form.controls.builtAt.dirty && { builtAt }) };
  }
}
