import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, DestroyRef, inject, output, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { JobRunView } from '@shared/contracts/job-runs';
import type { Problem } from '@shared/contracts/problem';
import { map, switchMap } from 'rxjs';
import { followRun } from '../ui/follow-run';
import { problemOf } from '../ui/problem';
import { ProgressLine } from '../ui/progress-line';
import { runWords } from './run-words';
import { ProductInView } from './product-in-view';

/** Lets a lead have the product judged at once and shows how far the run is; the run goes on when the page is left. */
@Component({
  selector: 'app-judge-now',
  imports: [MatButton, MatIcon, ProgressLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <span class="words small" aria-live="polite" [class.failed]="problem() || run()?.status === 'failed'">{{
      words()
    }}</span>
    <span class="act">
      <button mat-stroked-button type="button" [disabled]="isBusy()" (click)="judge()">
        <mat-icon svgIcon="play" />Judge now
      </button>
      @if (isBusy()) {
        <app-progress-line class="line" label="Judging" [doneFraction]="doneFraction()" />
      }
    </span>
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 12px;
      align-items: center;
    }
    .words:empty {
      display: none;
    }
    .words {
      max-width: 48ch;
      color: var(--sl-ink-muted);
    }
    .failed {
      color: var(--sl-lost);
    }
    .act {
      position: relative;
    }
    .line {
      position: absolute;
      inset: auto 0 -5px;
    }
  `,
})
export class JudgeNow {
  private readonly http = inject(HttpClient);
  private readonly view = inject(ProductInView);
  private readonly destroyed = inject(DestroyRef);

  readonly finished = output();

  protected readonly run = signal<JobRunView | null>(null);
  protected readonly isBusy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly words = computed(() => this.problem()?.detail ?? runWords(this.run()));
  protected readonly doneFraction = computed(() => {
    const run = this.run();
    return run && run.total > 0 ? run.done / run.total : undefined;
  });

  protected judge(): void {
    this.isBusy.set(true);
    this.problem.set(null);
    this.run.set(null);
    this.http
      .post<{ runs: JobRunView[] }>(`/api/teams/${this.view.owner()}/judge`, { product: this.view.key() })
      .pipe(
        map(({ runs }) => runs[0].id),
        switchMap((id) => followRun(this.http, id)),
        takeUntilDestroyed(this.destroyed),
      )
      .subscribe({
        next: (run) => this.run.set(run),
        error: (error: unknown) => {
          this.problem.set(problemOf(error));
          this.isBusy.set(false);
        },
        complete: () => {
          this.isBusy.set(false);
          this.finished.emit();
        },
      });
  }
}
