import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSnackBar } from '@angular/material/snack-bar';
import type { Problem } from '@shared/contracts/problem';
import type { InstallationTeam, PersonView } from '@shared/contracts/teams';
import type { Observable } from 'rxjs';
import { SessionStore } from '../session/session-store';
import { Confirm } from '../ui/confirm';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { InstallationStore } from './installation-store';
import { PeopleTable } from './people-table';
import type { PersonChange } from './person-change';
import { personQuestion } from './person-question';

/** The people of the installation, with their teams. */
@Component({
  selector: 'app-people-page',
  imports: [MatButton, MatFormFieldModule, MatInput, PeopleTable, ProblemBanner, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="filter-row" role="search">
      <mat-form-field>
        <mat-label>Search</mat-label>
        <input matInput type="search" #field autocomplete="off" (input)="text.set(field.value)" />
      </mat-form-field>
      <span class="muted small">People join by an invitation into a team.</span>
    </div>
    @if (loadProblem(); as problem) {
      <app-problem-banner [problem]="problem">
        <button mat-stroked-button type="button" (click)="reload()">Try again</button>
      </app-problem-banner>
    }
    @if (problem(); as problem) {
      <app-problem-banner [problem]="problem" kept="Nothing was changed." />
    }
    @if (found(); as people) {
      <app-people-table [people]="people" [teams]="openTeams()" [myId]="myId()" (changed)="change($event)" />
    } @else if (!loadProblem()) {
      <app-skeleton label="Loading the people" [heightPx]="320" />
    }
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 12px;
    }
  `,
})
export class PeoplePage {
  private readonly store = inject(InstallationStore);
  private readonly session = inject(SessionStore);
  private readonly confirm = inject(Confirm);
  private readonly snackBar = inject(MatSnackBar);

  private readonly people = httpResource<PersonView[]>(() => '/api/installation/people');
  private readonly teams = httpResource<InstallationTeam[]>(() => '/api/installation/teams');
  protected readonly openTeams = computed(() =>
    this.teams.hasValue() ? this.teams.value().filter(({ isArchived }) => !isArchived) : [],
  );
  protected readonly text = signal('');
  protected readonly found = computed(() => {
    const text = this.text().trim().toLowerCase();
    if (!this.people.hasValue()) return undefined;
    return this.people.value().filter(({ name, email }) => `${name} ${email}`.toLowerCase().includes(text));
  });
  protected readonly myId = computed(() => this.session.person()?.id ?? 0);
  protected readonly loadProblem = computed(() => {
    const error = this.people.error() ?? this.teams.error();
    return error && problemOf(error);
  });
  protected readonly problem = signal<Problem | null>(null);

  protected async change(change: PersonChange): Promise<void> {
    const question = personQuestion(change, this.myId());
    if (question !== null && !(await this.confirm.ask(question))) return;
    this.problem.set(null);
    this.send(change).subscribe({
      next: () => {
        this.people.reload();
        this.session.reload().subscribe();
        this.snackBar.open(`${change.person.name} is changed.`, undefined, { duration: 5000 });
      },
      error: (error: unknown) => {
        this.problem.set(problemOf(error));
        this.people.reload();
      },
    });
  }

  protected reload(): void {
    this.people.reload();
    this.teams.reload();
  }

  private send({ person, ...change }: PersonChange): Observable<unknown> {
    switch (change.kind) {
      case 'role':
        return this.store.setRole(person.id, change.team, change.role);
      case 'leave':
        return this.store.removeFromTeam(person.id, change.team);
      case 'account':
        return this.store.editPerson(person.id, change.patch);
    }
  }
}
