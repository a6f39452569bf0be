import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import type { LimitSetView } from '@shared/contracts/limits';
import { formatFrequency } from '@shared/units/format-frequency';
import { FULL_RANGE_HZ } from '../ui/chart/frequency-scale';
import { SpectrumChart } from '../ui/chart/spectrum-chart';
import type { SpectrumLimit, SpectrumMark, SpectrumView } from '../ui/chart/spectrum-types';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { chosenSets, readAtHz } from './limits-address';
import { namedLines } from './named-lines';
import { LimitReader } from './limit-reader';
import { LimitSetCard } from './limit-set-card';

/** The limit sets of this installation: their lines, their numbers, and the limit at any frequency. */
@Component({
  selector: 'app-limits-page',
  imports: [LimitReader, LimitSetCard, MatButton, PageHeader, ProblemBanner, Skeleton, SpectrumChart],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './limits-page.html',
  styleUrl: './limits-page.scss',
})
export class LimitsPage {
  private readonly router = inject(Router);

  /** Of the address: keys of the sets in the chart, and where limits are read, Hz. */
  readonly sets = input<string>();
  readonly at = input<string>();

  protected readonly all = httpResource<LimitSetView[]>(() => '/api/v1/limits');
  protected readonly problem = computed(() => {
    const error = this.all.error();
    return error ? problemOf(error) : null;
  });
  protected readonly chosen = computed(() => (this.all.hasValue() ? chosenSets(this.all.value(), this.sets()) : []));
  protected readonly frequencyHz = computed(() => readAtHz(this.at()));

  /** Right end of the chart: names are written there. */
  private readonly rightEndHz = signal<number>(FULL_RANGE_HZ.toHz);
  protected readonly limits = computed((): SpectrumLimit[] => namedLines(this.chosen(), this.rightEndHz()));
  protected readonly marks = computed((): SpectrumMark[] => [
    { frequencyHz: this.frequencyHz(), label: formatFrequency(this.frequencyHz()) },
  ]);

  protected isShown(set: LimitSetView): boolean {
    return this.chosen().includes(set);
  }

  protected show(set: LimitSetView, isShown: boolean): void {
    const keys = this.chosen().map(({ key }) => key);
    const next = isShown ? [...keys, set.key] : keys.filter((key) => key !== set.key);
    this.change({ sets: next.join(',') });
  }

  protected read(frequencyHz: number): void {
    this.change({ at: String(frequencyHz) });
  }

  /** A click in the chart reads the limits there. */
  protected followChart({ pinsHz, toHz }: SpectrumView): void {
    this.rightEndHz.set(toHz);
    const pinHz = pinsHz.at(-1);
    if (pinHz !== undefined) this.read(pinHz);
  }

  private change(queryParams: Record<string, string>): void {
    void this.router.navigate([], {
      queryParams,
      queryParamsHandling: 'merge',
      replaceUrl: true,
      scroll: 'manual',
    });
  }
}
