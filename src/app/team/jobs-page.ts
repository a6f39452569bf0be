import { HttpClient, httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, linkedSignal, signal } from '@angular/core';
import { takeUntilDestroyed, toObservable } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { JobRunView, JudgeStarted } from '@shared/contracts/job-runs';
import type { Problem } from '@shared/contracts/problem';
import { distinctUntilChanged, filter, interval, switchMap } from 'rxjs';
import { CurrentTeam } from '../session/current-team';
import { EmptyState } from '../ui/empty-state';
import { isUnderWay } from '../ui/follow-run';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { judgingSentence } from './judging-sentence';
import { RunTable } from './run-table';
import { pathOf } from './team-access';

/** How often the list is read anew, ms: while something runs, and while nothing does. */
const BUSY_MS = 1000;
const QUIET_MS = 15_000;

/** Runs of the jobs of a team, and judging at once for leads. */
@Component({
  selector: 'app-jobs-page',
  imports: [EmptyState, MatButton, MatIcon, PageHeader, ProblemBanner, RunTable, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './jobs-page.html',
})
export class JobsPage {
  private readonly http = inject(HttpClient);
  private readonly currentTeam = inject(CurrentTeam);

  readonly team = input.required<string>();

  private readonly answer = httpResource<JobRunView[]>(() => `${pathOf(this.team())}/jobs`);
  /** A list that cannot be read for once stays on show. */
  protected readonly runs = linkedSignal<JobRunView[] | undefined, JobRunView[] | undefined>({
    source: () => (this.answer.hasValue() ? this.answer.value() : undefined),
    computation: (now, before) => now ?? before?.value,
  });
  protected readonly isBusy = computed(() => this.runs()?.some(isUnderWay) ?? false);
  protected readonly loadProblem = computed(() => {
    const error = this.answer.error();
    return error && problemOf(error);
  });

  protected readonly mayJudge = computed(() => this.currentTeam.may('judging.start'));
  private readonly asked = signal<readonly number[]>([]);
  protected readonly sentence = computed(() => {
    const ids = this.asked();
    return judgingSentence(this.runs()?.filter(({ id }) => ids.includes(id)) ?? []);
  });
  protected readonly isAsking = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  constructor() {
    toObservable(this.isBusy)
      .pipe(
        distinctUntilChanged(),
        switchMap((isBusy) => interval(isBusy ? BUSY_MS : QUIET_MS)),
        filter(() => !document.hidden),
        takeUntilDestroyed(),
      )
      .subscribe(() => this.answer.reload());
  }

  protected judge(): void {
    this.isAsking.set(true);
    this.problem.set(null);
    this.http.post<JudgeStarted>(`${pathOf(this.team())}/judge`, {}).subscribe({
      next: ({ runs }) => {
        this.asked.set(runs.map(({ id }) => id));
        this.isAsking.set(false);
        this.answer.reload();
      },
      error: (error: unknown) => {
        this.problem.set(problemOf(error));
        this.isAsking.set(false);
      },
    });
  }

  protected reload(): void {
    this.answer.reload();
  }
}
