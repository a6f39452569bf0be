import { ChangeDetectionStrategy, Component, effect, inject, input, output, signal, untracked } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatInput } from '@angular/material/input';
import type { Problem } from '@shared/contracts/problem';
import type { TeamView } from '@shared/contracts/teams';
import { applyProblem } from '../ui/apply-problem';
import { DecibelsPipe } from '../ui/decibels';
import { FieldErrorPipe } from '../ui/field-error';
import { FrequencyPipe } from '../ui/frequency';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { TeamAccess } from './team-access';
import { fillTeamSettings, teamPatch, teamSettingsForm } from './team-settings-form';

/** Name, zone, target margin, threshold and own bands: a form for leads, a list for everybody else. */
@Component({
  selector: 'app-team-settings',
  imports: [
    DecibelsPipe,
    FieldErrorPipe,
    FrequencyPipe,
    MatButton,
    MatFormFieldModule,
    MatIcon,
    MatIconButton,
    MatInput,
    ProblemBanner,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './team-settings.html',
  styleUrl: './team-settings.scss',
})
export class TeamSettings {
  private readonly access = inject(TeamAccess);

  readonly team = input.required<TeamView>();
  readonly mayEdit = input.required<boolean>();
  readonly saved = output<TeamView>();

  private readonly settings = teamSettingsForm();
  protected readonly form = this.settings.form;
  protected readonly zones = Intl.supportedValuesOf('timeZone');
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  constructor() {
    effect(() => {
      const team = this.team();
      untracked(() => fillTeamSettings(this.settings, team));
    });
  }

  protected addBand(): void {
    this.form.controls.bands.push(this.settings.band('', null, null));
    this.form.markAsDirty();
  }

  protected removeBand(index: number): void {
    this.form.controls.bands.removeAt(index);
    this.form.markAsDirty();
  }

  protected restore(): void {
    fillTeamSettings(this.settings, this.team());
    this.problem.set(null);
  }

  protected save(): void {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    const patch = teamPatch(this.settings, this.team());
    if (Object.keys(patch).length === 0) {
      this.form.markAsPristine();
      return;
    }
    this.busy.set(true);
    this.problem.set(null);
    this.access.edit(this.team().key, patch).subscribe({
      next: (team) => {
        this.busy.set(false);
        this.saved.emit(team);
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
