import { httpResource } from '@angular/common/http';
import { BreakpointObserver } from '@angular/cdk/layout';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { MatIcon } from '@angular/material/icon';
import { Router, RouterLink } from '@angular/router';
import type { ProductSummary } from '@shared/contracts/products';
import { firstValueFrom, map } from 'rxjs';
import { CurrentTeam } from '../session/current-team';
import { EmptyState } from '../ui/empty-state';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { byUrgency } from './attention';
import { AttentionList } from './attention-list';
import { ProductCards } from './product-cards';
import { ProductTable } from './product-table';

/** Below this the table would scroll sideways. */
const CARDS = '(max-width: 1019.98px)';

/** The products of a team and those shared with it, the most urgent first. */
@Component({
  selector: 'app-overview-page',
  imports: [
    AttentionList,
    EmptyState,
    MatButton,
    MatIcon,
    PageHeader,
    ProblemBanner,
    ProductCards,
    ProductTable,
    RouterLink,
    Skeleton,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './overview-page.html',
  styles: `
    .first {
      margin-top: 8px;
    }
  `,
})
export class OverviewPage {
  private readonly dialog = inject(MatDialog);
  private readonly router = inject(Router);
  protected readonly currentTeam = inject(CurrentTeam);

  /** Key of the team, from the address. */
  readonly team = input.required<string>();

  private readonly answer = httpResource<ProductSummary[]>(() => ({
    url: '/api/v1/products',
    params: { team: this.team() },
  }));
  protected readonly products = computed(() => (this.answer.hasValue() ? byUrgency(this.answer.value()) : undefined));
  protected readonly problem = computed(() => {
    const error = this.answer.error();
    return error && problemOf(error);
  });
  protected readonly isNarrow = toSignal(
    inject(BreakpointObserver)
      .observe(CARDS)
      .pipe(map(({ matches }) => matches)),
    { initialValue: false },
  );
  protected readonly teamName = computed(() => this.currentTeam.team()?.name ?? this.team());
  protected readonly mayCreate = computed(() => this.currentTeam.may('products.edit'));
  protected readonly mayImport = computed(() => this.currentTeam.may('sweeps.add'));

  protected reload(): void {
    this.answer.reload();
  }

  protected async createProduct(): Promise<void> {
    const { NewProductDialog } = await import('./new-product-dialog');
    const dialog = this.dialog.open<unknown, { teamKey: string }, string>(NewProductDialog, {
      data: { teamKey: this.team() },
      width: '560px',
    });
    const key = await firstValueFrom(dialog.afterClosed());
    if (key !== undefined) await this.router.navigate(['/t', this.team(), 'products', key, 'settings']);
  }
}
