import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { MatIcon } from '@angular/material/icon';
import type { ProductSummary } from '@shared/contracts/products';
import { FrequencyPipe } from '../ui/frequency';
import { MarginValue } from '../ui/margin-value';
import { SignedDecibelsPipe } from '../ui/signed-decibels';
import { Sparkline } from '../ui/sparkline';
import { TimeStamp } from '../ui/time-stamp';
import { VerdictChip } from '../ui/verdict-chip';
import { MarginReach } from './margin-reach';
import { marginScale, percentAt } from './margin-scale';
import { productRows } from './product-rows';

/** The products of a team on a wide screen, one line each. */
@Component({
  selector: 'app-product-table',
  imports: [
    FrequencyPipe,
    MarginReach,
    MarginValue,
    MatIcon,
    RouterLink,
    SignedDecibelsPipe,
    Sparkline,
    TimeStamp,
    VerdictChip,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './product-table.html',
  styleUrl: './product-table.scss',
})
export class ProductTable {
  readonly products = input.required<readonly ProductSummary[]>();
  readonly teamKey = input.required<string>();

  protected readonly rows = computed(() => productRows(this.teamKey(), this.products()));
  protected readonly scale = computed(() => marginScale(this.products()));
  protected readonly limitAt = computed(() => percentAt(0, this.scale()));
}
