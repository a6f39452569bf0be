import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { scan, switchMap } from 'rxjs';
import type { ImportBatchView } from '@shared/contracts/imports';
import type { Problem } from '@shared/contracts/problem';
import { CurrentTeam } from '../session/current-team';
import { PageHeader } from '../ui/page-header';
import { ProblemBanner } from '../ui/problem-banner';
import { ProgressLine } from '../ui/progress-line';
import { Skeleton } from '../ui/skeleton';
import { TimeStamp } from '../ui/time-stamp';
import { BatchBuildCard } from './batch-build-card';
import { batchBuilds } from './batch-builds';
import { BatchItems } from './batch-items';
import { ImportApi } from './import-api';
import { ReadingProblem } from './reading-problem';
import { BatchNews, watchBatch } from './watch-batch';

interface Known {
  batch: ImportBatchView | null;
  problem: Problem | null;
}

/** A batch of files that was handed over: how far it is, what became of every trace, and the way to the result. */
@Component({
  selector: 'app-batch-page',
  imports: [
    BatchBuildCard,
    BatchItems,
    MatButton,
    PageHeader,
    ProblemBanner,
    ProgressLine,
    ReadingProblem,
    RouterLink,
    Skeleton,
    TimeStamp,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './batch-page.html',
  styleUrl: './batch-page.scss',
})
export class BatchPage {
  private readonly api = inject(ImportApi);
  protected readonly current = inject(CurrentTeam);

  readonly team = input.required<string>();
  /** Number of the batch, from the address. */
  readonly batch = input.required<string>();

  private readonly place = computed(() => ({ team: this.team(), id: Number(this.batch()) }));
  private readonly known = toSignal(
    toObservable(this.place).pipe(
      switchMap(({ team, id }) =>
        watchBatch(this.api.batch(team, id)).pipe(scan(learn, { batch: null, problem: null } as Known)),
      ),
    ),
    { initialValue: { batch: null, problem: null } },
  );

  protected readonly view = computed(() => this.known().batch);
  protected readonly problem = computed(() => this.known().problem);
  protected readonly builds = computed(() => batchBuilds(this.view()?.items ?? []));
  protected readonly refused = computed(() =>
    (this.view()?.items ?? []).filter(({ status, problem }) => status === 'refused' && problem !== null),
  );
  protected readonly settled = computed(() => {
    const view = this.view();
    return view ? view.total - view.waiting : 0;
  });
  protected readonly doneFraction = computed(() => {
    const total = this.view()?.total ?? 0;
    return total === 0 ? undefined : this.settled() / total;
  });
  protected readonly counts = computed(() => {
    const view = this.view();
    if (!view) return [];
    return [
      { words: 'imported', count: view.imported },
      { words: 'stored before', count: view.duplicate },
      { words: 'refused', count: view.refused },
      { words: 'waiting', count: view.waiting },
    ];
  });
  protected readonly lead = computed(() => {
    const view = this.view();
    if (!view) return '';
    const traces = view.total === 1 ? 'One trace' : `${view.total} traces`;
    return `${traces}, handed over by ${view.createdBy}`;
  });
}

/** What is known of the batch stays on the page while the server does not answer. */
function learn(known: Known, news: BatchNews): Known {
  return 'batch' in news ? { batch: news.batch, problem: null } : { ...known, problem: news.problem };
}
