import { HttpClient, httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';
import { Router } from '@angular/router';
import type { TrendView } from '@shared/contracts/margins';
import { forkJoin, map } from 'rxjs';
import { TrendChart } from '../../ui/chart/trend-chart';
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
import { SwitchingHistory } from './switching-history';
import { trendBuilds, trendSeries } from './trend-series';
import { trendAsks, type TrendSplit, trendSplit } from './trend-split';

/** Worst margin build after build, over all or one line for each band, state, line or detector. */
@Component({
  selector: 'app-trend-tab',
  imports: [
    MatButton,
    MatFormFieldModule,
    MatSelectModule,
    NothingMeasured,
    ProblemBanner,
    SeriesFilter,
    Skeleton,
    SwitchingHistory,
    TrendChart,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './trend-tab.html',
  styleUrl: '../chart-tab.scss',
})
export class TrendTab {
  private readonly http = inject(HttpClient);
  private readonly router = inject(Router);
  private readonly address = inject(AddressQuery);
  protected readonly view = inject(ProductInView);

  readonly state = input<string>();
  readonly line = input<string>();
  readonly detector = input<string>();
  readonly band = input<string>();
  readonly split = input<string>();
  readonly first = input<string>();
  readonly last = input<string>();

  protected readonly choice = computed(() =>
    seriesChoice({ state: this.state(), line: this.line(), detector: this.detector() }, this.view.product()),
  );
  protected readonly splitBy = computed(() => trendSplit(this.split()));

  /** The whole range over the choice: brings the builds and the bands one can ask for. */
  private readonly wholeAnswer = httpResource<TrendView>(() =>
    this.view.product() ? { url: this.url(), params: { ...this.view.apiTeam(), ...this.choice() } } : undefined,
  );
  protected readonly whole = keptValue(this.wholeAnswer);
  protected readonly chosenBand = computed(() => this.whole()?.bands.find((band) => band === this.band()));
  /** What the whole answer does not hold already. */
  private readonly asks = computed(() => {
    const [product, whole] = [this.view.product(), this.whole()];
    const isWhole = this.splitBy() === null && this.chosenBand() === undefined;
    return product && whole && !isWhole
      ? trendAsks(this.splitBy(), this.choice(), this.chosenBand(), product, whole.bands)
      : undefined;
  });

  private readonly linesAnswer = rxResource({
    params: () => this.asks(),
    stream: ({ params: asks }) =>
      forkJoin(
        asks.map(({ label, query }) =>
          this.http
            .get<TrendView>(this.url(), { params: { ...this.view.apiTeam(), ...query } })
            .pipe(map((view) => ({ label, view }))),
        ),
      ),
  });
  private readonly lines = keptValue(this.linesAnswer);
  private readonly wholeProblem = problemOfResource(this.wholeAnswer);
  private readonly linesProblem = problemOfResource(this.linesAnswer);
  protected readonly problem = computed(() => this.wholeProblem() ?? this.linesProblem());

  protected readonly builds = computed(() => {
    const whole = this.whole();
    return whole ? trendBuilds(whole) : [];
  });
  protected readonly series = computed(() => {
    const whole = this.whole();
    const lines = this.asks() === undefined ? whole && [{ label: this.words(), view: whole }] : this.lines();
    return lines?.map(({ label, view }) => trendSeries(label, view, this.builds()));
  });
  protected readonly isEmpty = computed(
    () => this.series()?.every(({ points }) => points.every((p) => p === null)) ?? false,
  );
  protected readonly range = computed(() => rangeOf(this.buildIds(), this.first(), this.last()));
  private readonly buildIds = computed(() => this.builds().map(({ id }) => id));
  protected readonly words = computed(() => [this.chosenBand(), seriesWords(this.choice())].filter(Boolean).join(', '));

  /** NOTE: a select shows no text for null, which it takes for "nothing chosen". */
  protected readonly any = '';

  protected chooseBand(band: string | null): void {
    this.address.patch({ band, ...(this.splitBy() === 'band' && { split: null }) });
  }

  /** What the lines are for cannot be filtered at the same time. */
  protected chooseSplit(split: TrendSplit | null): void {
    this.address.patch({ split, ...(split && { [split]: null }) });
  }

  protected openBuild(buildId: number): void {
    void this.router.navigate([...this.view.link(), 'builds', buildId], { queryParams: this.view.linkQuery() });
  }

  protected keepZoom(range: BuildRange): void {
    this.address.patch(zoomQuery(this.buildIds(), range));
  }

  protected reload(): void {
    this.wholeAnswer.reload();
    this.linesAnswer.reload();
  }

  private url(): string {
    return `${this.view.api()}/trend`;
  }
}
