import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, linkedSignal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { DropSummary } from '@shared/contracts/drops';
import type { ProductSummary } from '@shared/contracts/products';
import type { MembersView } from '@shared/contracts/teams';
import { isAtLeast } from '@shared/access/roles';
import { CurrentTeam } from '../session/current-team';
import { EmptyState } from '../ui/empty-state';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { type DropFilter, dropFilterQuery, dropsRequest, readDropFilter } from './drop-filter';
import { DropFilterRow } from './drop-filter-row';
import { DropList } from './drop-list';
import { dropsSentence } from './drops-sentence';

/** How many rows are drawn at once, and how many more at a time. */
const ROWS = 100;

/** The drops of a team: those over the limit first, then those with the least margin left. */
@Component({
  selector: 'app-drops-page',
  imports: [DropFilterRow, DropList, EmptyState, MatButton, PageHeader, ProblemBanner, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './drops-page.html',
})
export class DropsPage {
  private readonly router = inject(Router);
  private readonly currentTeam = inject(CurrentTeam);

  /** From the address. */
  readonly team = input.required<string>();
  readonly state = input<string>();
  readonly product = input<string>();
  readonly owner = input<string>();

  protected readonly filter = computed(() =>
    readDropFilter({ state: this.state(), product: this.product(), owner: this.owner() }),
  );
  private readonly products = httpResource<ProductSummary[]>(() => ({
    url: '/api/v1/products',
    params: { team: this.team() },
  }));
  private readonly members = httpResource<MembersView>(() => `/api/teams/${this.team()}/members`);
  private readonly answer = httpResource<DropSummary[]>(() => {
    const filter = this.filter();
    if (filter.product === null) return dropsRequest(this.team(), filter);
    // Whose product it is stands in the list of products.
    return this.products.isLoading() ? undefined : dropsRequest(this.team(), filter, this.ownerOf(filter.product));
  });

  protected readonly drops = computed(() => (this.answer.hasValue() ? this.answer.value() : undefined));
  protected readonly shownCount = linkedSignal({ source: this.drops, computation: () => ROWS });
  protected readonly shown = computed(() => this.drops()?.slice(0, this.shownCount()) ?? []);
  protected readonly sentence = computed(() => {
    const drops = this.drops();
    return drops && dropsSentence(drops, this.filter());
  });
  protected readonly problem = computed(() => {
    const error = this.answer.error();
    return error && problemOf(error);
  });
  protected readonly productChoices = computed(() => this.productList().map(({ key, name }) => ({ key, name })));
  protected readonly people = computed(() =>
    this.members.hasValue() ? this.members.value().members.filter(({ role }) => isAtLeast(role, 'technician')) : [],
  );
  protected readonly targets = computed(
    () => new Map(this.productList().map(({ key, team, targetMarginDb }) => [`${team} ${key}`, targetMarginDb])),
  );
  protected readonly teamTargetDb = this.currentTeam.targetMarginDb;
  protected readonly isFiltered = computed(() => {
    const { state, product, owner } = this.filter();
    return state !== 'open' || product !== null || owner !== null;
  });

  protected choose(filter: DropFilter): void {
    void this.router.navigate([], { queryParams: dropFilterQuery(filter), replaceUrl: true });
  }

  protected showMore(): void {
    this.shownCount.update((count) => count + ROWS);
  }

  protected reload(): void {
    this.answer.reload();
  }

  private productList(): ProductSummary[] {
    return this.products.hasValue() ? this.products.value() : [];
  }

  private ownerOf(key: string): string | undefined {
    const named = this.productList().filter((product) => product.key === key);
    return (named.find(({ isShared }) => !isShared) ?? named[0])?.team;
  }
}
