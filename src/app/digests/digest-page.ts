import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatSnackBar } from '@angular/material/snack-bar';
import type { DigestView } from '@shared/contracts/digests';
import type { Problem } from '@shared/contracts/problem';
import type { Observable } from 'rxjs';
import { CurrentTeam } from '../session/current-team';
import { Confirm } from '../ui/confirm';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { DigestSchedule } from './digest-schedule';
import { digestPath, DigestSettings } from './digest-settings';
import { OwnDigest } from './own-digest';
import { RecipientForm } from './recipient-form';
import { RecipientTable } from './recipient-table';
import { SentTable } from './sent-table';

/** The weekly digest of a team: when, to whom, and how the last ones arrived. */
@Component({
  selector: 'app-digest-page',
  imports: [
    DigestSchedule,
    MatButton,
    OwnDigest,
    PageHeader,
    ProblemBanner,
    RecipientForm,
    RecipientTable,
    SentTable,
    Skeleton,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './digest-page.html',
  styleUrl: './digest-page.scss',
})
export class DigestPage {
  private readonly settings = inject(DigestSettings);
  private readonly confirm = inject(Confirm);
  private readonly snackBar = inject(MatSnackBar);
  private readonly currentTeam = inject(CurrentTeam);

  readonly team = input.required<string>();

  protected readonly digest = httpResource<DigestView>(() => digestPath(this.team()));
  protected readonly mayManage = computed(() => this.currentTeam.may('digests.manage'));
  protected readonly loadProblem = computed(() => {
    const error = this.digest.error();
    return error && problemOf(error);
  });
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected edit(patch: { isOn?: boolean; weekday?: number; hour?: number }): void {
    this.act(this.settings.edit(this.team(), patch), 'The digest is changed.');
  }

  protected setMine(isOn: boolean): void {
    this.act(
      this.settings.setMine(this.team(), isOn),
      isOn ? 'You get the digest from now on.' : 'You get no more digests of this team.',
    );
  }

  protected async removeRecipient({ id, email }: DigestView['recipients'][number]): Promise<void> {
    const isSure = await this.confirm.ask({
      title: `Stop the digest for ${email}?`,
      text: 'The address gets no more digests. It can be added again.',
      action: 'Stop it',
    });
    if (isSure) this.act(this.settings.removeRecipient(this.team(), id), `${email} gets no more digests.`);
  }

  protected show(digest: DigestView): void {
    this.digest.set(digest);
  }

  protected reload(): void {
    this.digest.reload();
  }

  private act(change: Observable<unknown>, done: string): void {
    this.busy.set(true);
    this.problem.set(null);
    change.subscribe({
      next: () => {
        this.busy.set(false);
        this.digest.reload();
        this.snackBar.open(done, undefined, { duration: 5000 });
      },
      error: (error: unknown) => {
        this.problem.set(problemOf(error));
        this.busy.set(false);
        this.digest.reload();
      },
    });
  }
}
