import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { MatSnackBar } from '@angular/material/snack-bar';
import type { Problem } from '@shared/contracts/problem';
import type { InstallationTeam } from '@shared/contracts/teams';
import { firstValueFrom } from 'rxjs';
import { SessionStore } from '../session/session-store';
import { Confirm } from '../ui/confirm';
import { EmptyState } from '../ui/empty-state';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { InstallationStore } from './installation-store';
import { TeamForm } from './team-form';
import { TeamTable } from './team-table';

/** The teams of the installation. */
@Component({
  selector: 'app-teams-page',
  imports: [EmptyState, MatButton, ProblemBanner, Skeleton, TeamForm, TeamTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (loadProblem(); as problem) {
      <app-problem-banner [problem]="problem">
        <button mat-stroked-button type="button" (click)="reload()">Try again</button>
      </app-problem-banner>
    }
    @if (problem(); as problem) {
      <app-problem-banner [problem]="problem" kept="The team is as before." />
    }
    @if (teams.hasValue()) {
      @if (teams.value().length > 0) {
        <app-team-table
          [teams]="teams.value()"
          (invited)="invite($event)"
          (archived)="archive($event)"
          (restored)="restore($event)"
        />
      } @else {
        <app-empty-state icon="team" heading="No team yet" text="Make one below, then invite its first lead." />
      }
    } @else if (!loadProblem()) {
      <app-skeleton label="Loading the teams" [heightPx]="200" />
    }
    <section class="sheet" aria-labelledby="new-team-title">
      <h2 id="new-team-title">Make a team</h2>
      <app-team-form (created)="noteCreated($event)" />
    </section>
  `,
  styles: `
    :host,
    .sheet {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 16px;
    }
    .sheet {
      gap: 12px;
    }
  `,
})
export class TeamsPage {
  private readonly store = inject(InstallationStore);
  private readonly session = inject(SessionStore);
  private readonly confirm = inject(Confirm);
  private readonly dialog = inject(MatDialog);
  private readonly snackBar = inject(MatSnackBar);

  protected readonly teams = httpResource<InstallationTeam[]>(() => '/api/installation/teams');
  protected readonly loadProblem = computed(() => {
    const error = this.teams.error();
    return error && problemOf(error);
  });
  protected readonly problem = signal<Problem | null>(null);

  protected noteCreated({ name }: InstallationTeam): void {
    this.teams.reload();
    this.say(`${name} is there. Invite its first lead.`);
  }

  protected async invite(team: InstallationTeam): Promise<void> {
    const { InviteDialog } = await import('./invite-dialog');
    const dialog = this.dialog.open<unknown, InstallationTeam, string>(InviteDialog, { data: team, width: '480px' });
    const email = await firstValueFrom(dialog.afterClosed());
    if (email !== undefined) this.say(`An invitation to ${team.name} is on its way to ${email}.`);
  }

  protected async archive(team: InstallationTeam): Promise<void> {
    const isSure = await this.confirm.ask({
      title: `Archive ${team.name}?`,
      text:
        `Its ${team.memberCount} members no longer see it, its ${team.productCount} products and its tokens stop. ` +
        'Nothing is deleted; you can bring it back.',
      action: 'Archive the team',
    });
    if (isSure) this.setArchived(team, true);
  }

  protected restore(team: InstallationTeam): void {
    this.setArchived(team, false);
  }

  protected reload(): void {
    this.teams.reload();
  }

  private setArchived({ key, name }: InstallationTeam, isArchived: boolean): void {
    this.problem.set(null);
    this.store.archiveTeam(key, isArchived).subscribe({
      next: () => {
        this.teams.reload();
        this.session.reload().subscribe();
        this.say(`${name} is ${isArchived ? 'archived' : 'back'}.`);
      },
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  private say(words: string): void {
    this.snackBar.open(words, undefined, { duration: 5000 });
  }
}
