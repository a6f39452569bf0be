import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatSnackBar } from '@angular/material/snack-bar';
import { Router } from '@angular/router';
import type { Role } from '@shared/access/roles';
import type { Problem } from '@shared/contracts/problem';
import type { MembersView, MemberView, PendingInvitation, TeamView } from '@shared/contracts/teams';
import type { Observable } from 'rxjs';
import { CurrentTeam } from '../session/current-team';
import { SessionStore } from '../session/session-store';
import { Confirm } from '../ui/confirm';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { InvitationTable } from './invitation-table';
import { InviteForm } from './invite-form';
import { MemberTable } from './member-table';
import { pathOf, TeamAccess } from './team-access';
import { TeamSettings } from './team-settings';

/** Who is in the team as what, who is invited, and the team's settings. */
@Component({
  selector: 'app-members-page',
  imports: [InvitationTable, InviteForm, MatButton, MemberTable, PageHeader, ProblemBanner, Skeleton, TeamSettings],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './members-page.html',
  styles: `
    .sheet {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 12px;
    }
  `,
})
export class MembersPage {
  private readonly access = inject(TeamAccess);
  private readonly confirm = inject(Confirm);
  private readonly router = inject(Router);
  private readonly snackBar = inject(MatSnackBar);
  private readonly currentTeam = inject(CurrentTeam);
  protected readonly session = inject(SessionStore);

  readonly team = input.required<string>();

  protected readonly members = httpResource<MembersView>(() => `${pathOf(this.team())}/members`);
  protected readonly settings = httpResource<TeamView>(() => pathOf(this.team()));
  protected readonly mayManage = computed(() => this.currentTeam.may('members.manage'));
  protected readonly mayEdit = computed(() => this.currentTeam.may('team.edit'));
  protected readonly lead = computed(() => {
    const role = this.currentTeam.role();
    return this.mayManage() ? '' : `You are ${role} here. Leads of the team change members and settings.`;
  });
  protected readonly loadProblem = computed(() => {
    const error = this.members.error() ?? this.settings.error();
    return error && problemOf(error);
  });
  protected readonly problem = signal<Problem | null>(null);

  protected async changeRole({ personId, name }: MemberView, role: Role): Promise<void> {
    const isMe = personId === this.session.person()?.id;
    if (isMe && !(await this.confirm.ask(ownRoleQuestion(role)))) {
      this.members.reload();
      return;
    }
    this.act(this.access.changeRole(this.team(), personId, role), `${name} is ${role} now.`);
  }

  protected async remove({ personId, name }: MemberView): Promise<void> {
    const isMe = personId === this.session.person()?.id;
    const isSure = await this.confirm.ask({
      title: isMe ? 'Leave the team?' : `Remove ${name} from the team?`,
      text:
        `${isMe ? 'You lose' : `${name} loses`} access to everything of the team at once. The account, drops owned and ` +
        'the history stay; an invitation brings the person back.',
      action: isMe ? 'Leave the team' : 'Remove from the team',
    });
    if (!isSure) return;
    this.act(this.access.remove(this.team(), personId), `${name} is no longer in the team.`);
  }

  protected resend({ id, email }: PendingInvitation): void {
    this.act(this.access.resend(this.team(), id), `A new link is on its way to ${email}; the old one is void.`);
  }

  protected async revoke({ id, email }: PendingInvitation): Promise<void> {
    const isSure = await this.confirm.ask({
      title: `Take back the invitation of ${email}?`,
      text: 'The link in the mail stops working. You can invite the same address again.',
      action: 'Take it back',
    });
    if (isSure) this.act(this.access.revoke(this.team(), id), `The invitation of ${email} is taken back.`);
  }

  protected noteInvited(email: string): void {
    this.members.reload();
    this.say(`An invitation is on its way to ${email}.`);
  }

  protected noteSaved(team: TeamView): void {
    this.settings.set(team);
    this.session.reload().subscribe();
    this.say('The settings are saved.');
  }

  protected reload(): void {
    this.members.reload();
    this.settings.reload();
  }

  /** Server truth after every change; one's own role or membership may be among what changed. */
  private act(change: Observable<unknown>, done: string): void {
    this.problem.set(null);
    change.subscribe({
      next: () => {
        this.say(done);
        this.session.reload().subscribe(({ teams }) => {
          if (teams.some(({ key }) => key === this.team())) this.members.reload();
          else void this.router.navigateByUrl('/');
        });
      },
      error: (error: unknown) => {
        this.problem.set(problemOf(error));
        this.members.reload();
      },
    });
  }

  private say(words: string): void {
    this.snackBar.open(words, undefined, { duration: 5000 });
  }
}

function ownRoleQuestion(role: Role) {
  return {
    title: `Make yourself ${role}?`,
    text: 'You would no longer manage this team; only another lead could give the role back to you.',
    action: `Become ${role}`,
  };
}
