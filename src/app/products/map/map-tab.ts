import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import type { MarginMapView } from '@shared/contracts/margins';
import { MarginMap, type MarginMapCell } from '../../ui/chart/margin-map';
import { ProblemBanner } from '../../ui/problem-banner';
import { Skeleton } from '../../ui/skeleton';
import { AddressQuery } from '../address-query';
import { type BuildRange, rangeOf, zoomQuery } from '../build-zoom';
import { keptValue } from '../kept-value';
import { NothingMeasured } from '../nothing-measured';
import { problemOfResource } from '../problem-of-resource';
import { ProductInView } from '../product-in-view';
import { seriesChoice, seriesWords } from '../series-choice';
import { SeriesFilter } from '../series-filter';

/** Builds x frequency: where the margin is small, and since which build. */
@Component({
  selector: 'app-map-tab',
  imports: [MarginMap, MatButton, NothingMeasured, ProblemBanner, SeriesFilter, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './map-tab.html',
  styleUrl: '../chart-tab.scss',
})
export class MapTab {
  private readonly router = inject(Router);
  private readonly address = inject(AddressQuery);
  protected readonly view = inject(ProductInView);

  readonly state = input<string>();
  readonly line = input<string>();
  readonly detector = input<string>();
  readonly first = input<string>();
  readonly last = input<string>();

  protected readonly choice = computed(() =>
    seriesChoice({ state: this.state(), line: this.line(), detector: this.detector() }, this.view.product()),
  );
  protected readonly words = computed(() => seriesWords(this.choice()));
  private readonly answer = httpResource<MarginMapView>(() =>
    this.view.product()
      ? { url: `${this.view.api()}/margin-map`, params: { ...this.view.apiTeam(), ...this.choice() } }
      : undefined,
  );
  protected readonly map = keptValue(this.answer);
  protected readonly problem = problemOfResource(this.answer);
  protected readonly builds = computed(
    () => this.map()?.builds.map(({ buildId, ...build }) => ({ id: buildId, ...build })) ?? [],
  );
  protected readonly range = computed(() => rangeOf(this.buildIds(), this.first(), this.last()));
  private readonly buildIds = computed(() => this.builds().map(({ id }) => id));
  protected readonly isEmpty = computed(
    () => this.map()?.cells.every((row) => row.every((marginDb) => marginDb === null)) ?? false,
  );

  protected openBuild({ buildId }: MarginMapCell): void {
    void this.router.navigate([...this.view.link(), 'builds', buildId], { queryParams: this.view.linkQuery() });
  }

  protected keepZoom(range: BuildRange): void {
    this.address.patch(zoomQuery(this.buildIds(), range));
  }

  protected reload(): void {
    this.answer.reload();
  }
}
