import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { ProductView } from '@shared/contracts/products';
import { findLimitSet } from '@shared/limits/limit-sets';
import { DecibelsPipe } from '../ui/decibels';
import { FrequencyPipe } from '../ui/frequency';
import { MarginValue } from '../ui/margin-value';
import { SignedDecibelsPipe } from '../ui/signed-decibels';
import { VerdictChip } from '../ui/verdict-chip';
import { ProductInView } from './product-in-view';

/** How the product stands now, in one row of facts. */
@Component({
  selector: 'app-product-standing',
  imports: [DecibelsPipe, FrequencyPipe, MarginValue, RouterLink, SignedDecibelsPipe, VerdictChip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './product-standing.html',
  styleUrl: './product-standing.scss',
})
export class ProductStanding {
  protected readonly view = inject(ProductInView);

  readonly product = input.required<ProductView>();

  protected readonly limitTitle = computed(
    () => findLimitSet(this.product().limitSetKey)?.title ?? this.product().limitSetKey,
  );
  /** Where nobody measured the latest build, the last one that was. */
  protected readonly lastMeasured = computed(() => {
    const latest = this.product().latestBuild;
    if (!latest || latest.worstMarginDb !== null) return undefined;
    return this.view.builds()?.findLast(({ worstMarginDb }) => worstMarginDb !== null);
  });
  protected readonly isOver = computed(() => (this.product().latestBuild?.worstMarginDb ?? 0) < 0);
}
