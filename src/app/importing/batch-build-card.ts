import { HttpClient, httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, DestroyRef, inject, input, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { RouterLink } from '@angular/router';
import type { BuildView } from '@shared/contracts/builds';
import type { JobRunView, JudgeStarted } from '@shared/contracts/job-runs';
import { switchMap } from 'rxjs';
import { CurrentTeam } from '../session/current-team';
import { followRun } from '../ui/follow-run';
import { MarginValue } from '../ui/margin-value';
import { problemOf } from '../ui/problem';
import { ProgressLine } from '../ui/progress-line';
import { VerdictChip } from '../ui/verdict-chip';
import type { BatchBuild } from './batch-builds';

/** A build that sweeps of a batch went into: where it stands, the way to it, and for leads its judgement at once. */
@Component({
  selector: 'app-batch-build-card',
  imports: [MarginValue, MatButton, MatIcon, ProgressLine, RouterLink, VerdictChip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './batch-build-card.html',
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 8px 24px;
      align-items: center;
      justify-content: space-between;
      padding: 12px 16px;
      border: 1px solid var(--sl-hairline);
      border-radius: 8px;
      background: var(--sl-surface);
    }
    .words {
      display: grid;
      gap: 4px;
      min-width: 0;
    }
    .name {
      font-size: 16px;
      font-weight: 500;
    }
    .facts {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 16px;
      align-items: center;
      font-size: 13px;
    }
    .acts {
      display: flex;
      flex-wrap: wrap;
      gap: 8px;
    }
    app-progress-line {
      flex-basis: 100%;
    }
  `,
})
export class BatchBuildCard {
  private readonly http = inject(HttpClient);
  private readonly destroyed = inject(DestroyRef);
  protected readonly current = inject(CurrentTeam);

  readonly team = input.required<string>();
  readonly build = input.required<BatchBuild>();
  readonly isFinished = input.required<boolean>();

  protected readonly view = httpResource<BuildView>(() => {
    const { product, buildId } = this.build();
    return `/api/v1/products/${encodeURIComponent(product)}/builds/${buildId}?team=${encodeURIComponent(this.team())}`;
  });
  protected readonly name = computed(() => {
    const view = this.view.hasValue() ? this.view.value() : undefined;
    return view ? `${view.hardware} / ${view.firmware}` : `build ${this.build().buildId}`;
  });
  protected readonly link = computed(() => [
    '/t',
    this.team(),
    'products',
    this.build().product,
    'builds',
    this.build().buildId,
  ]);

  protected readonly run = signal<JobRunView | null>(null);
  protected readonly isJudging = signal(false);
  protected readonly news = signal('');
  protected readonly doneFraction = computed(() => {
    const run = this.run();
    return run && run.total > 0 ? run.done / run.total : undefined;
  });

  protected judge(): void {
    this.isJudging.set(true);
    this.news.set('');
    this.http
      .post<JudgeStarted>(`/api/teams/${encodeURIComponent(this.team())}/judge`, { product: this.build().product })
      .pipe(
        switchMap(({ runs: [{ id }] }) => followRun(this.http, id)),
        takeUntilDestroyed(this.destroyed),
      )
      .subscribe({
        next: (run) => this.run.set(run),
        error: (error: unknown) => {
          this.isJudging.set(false);
          this.news.set(`${problemOf(error).detail} The sweeps are stored; the job judges them within minutes.`);
        },
        complete: () => {
          this.isJudging.set(false);
          if (this.run()?.status === 'failed') this.news.set('The judgement failed; see Job runs for why.');
          this.view.reload();
        },
      });
  }
}
