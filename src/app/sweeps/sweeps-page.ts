import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, linkedSignal, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { Router, RouterLink } from '@angular/router';
import type { ProductSummary } from '@shared/contracts/products';
import type { SweepPage, SweepView } from '@shared/contracts/sweeps';
import { CurrentTeam } from '../session/current-team';
import { EmptyState } from '../ui/empty-state';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { ProgressLine } from '../ui/progress-line';
import { Skeleton } from '../ui/skeleton';
import { addressOfChange, filterOfAddress, SweepFilterName } from './sweep-filter';
import { SweepFilterRow } from './sweep-filter-row';
import { SweepTable } from './sweep-table';
import { overlayOf } from './ticked-sweeps';

const ROWS = 50;

/** All sweeps of the team, narrowed by the address. */
@Component({
  selector: 'app-sweeps-page',
  imports: [
    EmptyState,
    MatButton,
    MatIcon,
    PageHeader,
    ProblemBanner,
    ProgressLine,
    RouterLink,
    Skeleton,
    SweepFilterRow,
    SweepTable,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sweeps-page.html',
  styleUrl: './sweeps-page.scss',
})
export class SweepsPage {
  private readonly router = inject(Router);
  protected readonly current = inject(CurrentTeam);

  /** Of the address. */
  readonly team = input.required<string>();
  readonly product = input<string>();
  readonly build = input<string>();
  readonly state = input<string>();
  readonly bench = input<string>();
  readonly line = input<string>();
  readonly detector = input<string>();
  readonly kind = input<string>();
  readonly before = input<string>();

  protected readonly filter = computed(() =>
    filterOfAddress({
      product: this.product(),
      build: this.build(),
      state: this.state(),
      bench: this.bench(),
      line: this.line(),
      detector: this.detector(),
      kind: this.kind(),
    }),
  );
  protected readonly isNarrowed = computed(() => Object.keys(this.filter()).length > 0);

  private readonly productList = httpResource<ProductSummary[]>(() => ({
    url: '/api/v1/products',
    params: { team: this.team() },
  }));
  protected readonly products = computed(() => (this.productList.hasValue() ? this.productList.value() : []));
  /** The team that owns the chosen product: another one where it is shared. */
  protected readonly owner = computed(
    () => this.products().find(({ key }) => key === this.filter().product)?.team ?? this.team(),
  );

  protected readonly page = httpResource<SweepPage>(() => ({
    url: '/api/v1/sweeps',
    params: {
      team: this.owner(),
      ...this.filter(),
      limit: ROWS,
      ...(this.before() && { before: this.before() ?? '' }),
    },
  }));
  /** The rows shown stay until the next ones are there. */
  protected readonly shown = linkedSignal<SweepPage | undefined, SweepPage | undefined>({
    source: () => (this.page.hasValue() ? this.page.value() : undefined),
    computation: (page, before) => page ?? before?.value,
  });
  protected readonly problem = computed(() => {
    const error = this.page.error();
    return error ? problemOf(error) : null;
  });

  private readonly tickedSweeps = signal<ReadonlyMap<number, SweepView>>(new Map());
  protected readonly ticked = computed(() => new Set(this.tickedSweeps().keys()));
  protected readonly overlay = computed(() => {
    const overlay = overlayOf([...this.tickedSweeps().values()]);
    if (typeof overlay === 'string') return { why: overlay };
    const { product, owner, sweeps } = overlay;
    return {
      commands: ['/t', this.team(), 'products', product, 'overlay'],
      query: { sweeps, ...(owner !== this.team() && { owner }) },
    };
  });

  protected change(change: Partial<Record<SweepFilterName, string | null>>): void {
    void this.router.navigate([], { queryParams: addressOfChange(change), queryParamsHandling: 'merge' });
  }

  protected showAll(): void {
    void this.router.navigate([], { queryParams: {} });
  }

  protected toggle(sweep: SweepView): void {
    this.tickedSweeps.update((ticked) => {
      const next = new Map(ticked);
      if (!next.delete(sweep.id)) next.set(sweep.id, sweep);
      return next;
    });
  }

  protected toggleAll(isTicked: boolean): void {
    this.tickedSweeps.update((ticked) => {
      const next = new Map(ticked);
      for (const sweep of this.shown()?.sweeps ?? []) {
        if (isTicked) next.set(sweep.id, sweep);
        else next.delete(sweep.id);
      }
      return next;
    });
  }

  protected untick(): void {
    this.tickedSweeps.set(new Map());
  }
}
