import { HttpClient, httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal, untracked } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatSnackBar } from '@angular/material/snack-bar';
import { Router, RouterLink } from '@angular/router';
import type { Problem } from '@shared/contracts/problem';
import type { OverlayTrace, SweepView } from '@shared/contracts/sweeps';
import { decodeFrames } from '@shared/traces/frames';
import { CurrentTeam } from '../session/current-team';
import { SpectrumChart } from '../ui/chart/spectrum-chart';
import type { SpectrumView } from '../ui/chart/spectrum-types';
import { Confirm } from '../ui/confirm';
import { FrequencyPipe } from '../ui/frequency';
import { MarginValue } from '../ui/margin-value';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { TimeStamp } from '../ui/time-stamp';
import { FactList } from './fact-list';
import { addressOfView, viewOfAddress } from './spectrum-address';
import { removalText, setUpFacts, tagFacts } from './sweep-facts';
import { sweepLimits, sweepTraces } from './sweep-traces';

/** One sweep: the trace over its limit, margins band by band, tags, set-up, remarks, and where it came from. */
@Component({
  selector: 'app-sweep-page',
  imports: [
    FactList,
    FrequencyPipe,
    MarginValue,
    MatButton,
    MatIcon,
    PageHeader,
    ProblemBanner,
    RouterLink,
    Skeleton,
    SpectrumChart,
    TimeStamp,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sweep-page.html',
  styleUrl: './sweep-page.scss',
})
export class SweepPage {
  private readonly http = inject(HttpClient);
  private readonly router = inject(Router);
  private readonly confirm = inject(Confirm);
  private readonly snackBar = inject(MatSnackBar);
  protected readonly current = inject(CurrentTeam);

  /** Of the address. */
  readonly team = input.required<string>();
  readonly sweep = input.required<string>();
  readonly fromHz = input<string>();
  readonly toHz = input<string>();
  readonly pins = input<string>();

  private readonly record = httpResource<SweepView>(() => `/api/v1/sweeps/${encodeURIComponent(this.sweep())}`);
  protected readonly view = computed(() => (this.record.hasValue() ? this.record.value() : undefined));
  protected readonly problem = computed(() => {
    const error = this.record.error();
    return error ? problemOf(error) : null;
  });

  private readonly frames = httpResource.arrayBuffer(() => {
    const view = this.view();
    if (!view) return undefined;
    const { id, kind, product, team } = view;
    const headers = { Accept: 'application/octet-stream' };
    // A sweep of the product comes with the background of the same bench and day, where there is one.
    return kind === 'product'
      ? { url: '/api/v1/overlay', params: { product, team, sweeps: id, kind: 'background' }, headers }
      : { url: `/api/v1/sweeps/${id}/trace`, headers };
  });
  protected readonly spectrum = computed(() => {
    const view = this.view();
    if (!view || !this.frames.hasValue()) return undefined;
    const frames = decodeFrames<OverlayTrace>(this.frames.value());
    return { traces: sweepTraces(frames, view.id), limits: sweepLimits(frames, view.id) };
  });
  protected readonly spectrumProblem = computed(() => {
    const error = this.frames.error();
    return error ? problemOf(error) : null;
  });
  /** What the address asked for when the sweep was opened; the chart keeps later changes itself. */
  protected readonly initialView = computed(() => {
    this.sweep();
    return untracked(() => viewOfAddress({ fromHz: this.fromHz(), toHz: this.toHz(), pins: this.pins() }));
  });

  protected readonly tags = computed(() => tagsOf(this.view(), tagFacts));
  protected readonly setUp = computed(() => tagsOf(this.view(), setUpFacts));
  protected readonly mayRemove = computed(() => this.view()?.team === this.team() && this.current.may('sweeps.remove'));
  protected readonly isRemoving = signal(false);
  protected readonly removalProblem = signal<Problem | null>(null);

  protected buildLink({ product, buildId }: SweepView): unknown[] {
    return ['/t', this.team(), 'products', product, 'builds', buildId];
  }

  protected overlayLink({ product }: SweepView): unknown[] {
    return ['/t', this.team(), 'products', product, 'overlay'];
  }

  /** A product of another team is named with its owner. */
  protected ownerQuery({ team }: SweepView): { owner?: string } {
    return team === this.team() ? {} : { owner: team };
  }

  protected keepView(view: SpectrumView): void {
    void this.router.navigate([], {
      queryParams: addressOfView(view),
      queryParamsHandling: 'merge',
      replaceUrl: true,
      scroll: 'manual',
    });
  }

  protected async remove(view: SweepView): Promise<void> {
    const isSure = await this.confirm.ask({
      title: `Remove sweep ${view.id}?`,
      text: removalText(view),
      action: 'Remove the sweep',
      name: `sweep ${view.id}`,
    });
    if (!isSure) return;
    this.isRemoving.set(true);
    this.http.delete(`/api/v1/sweeps/${view.id}`).subscribe({
      next: () => {
        this.snackBar.open(`Sweep ${view.id} is removed.`, undefined, { duration: 5000 });
        void this.router.navigate(['/t', this.team(), 'sweeps'], { queryParams: { product: view.product } });
      },
      error: (error: unknown) => {
        this.isRemoving.set(false);
        this.removalProblem.set(problemOf(error));
      },
    });
  }
}

function tagsOf<T>(view: SweepView | undefined, facts: (view: SweepView) => T[]): T[] {
  return view ? facts(view) : [];
}
