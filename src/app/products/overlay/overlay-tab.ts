import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatCheckbox } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';
import type { BuildView } from '@shared/contracts/builds';
import type { OverlayTrace, SweepPage } from '@shared/contracts/sweeps';
import { decodeFrames } from '@shared/traces/frames';
import { FULL_RANGE_HZ } from '../../ui/chart/frequency-scale';
import { SpectrumChart } from '../../ui/chart/spectrum-chart';
import type { SpectrumView } from '../../ui/chart/spectrum-types';
import { EmptyState } from '../../ui/empty-state';
import { ProblemBanner } from '../../ui/problem-banner';
import { Skeleton } from '../../ui/skeleton';
import { AddressQuery } from '../address-query';
import { keptValue } from '../kept-value';
import { NothingMeasured } from '../nothing-measured';
import { problemOfResource } from '../problem-of-resource';
import { ProductInView } from '../product-in-view';
import { seriesChoice, seriesWords } from '../series-choice';
import { SeriesFilter } from '../series-filter';
import { BuildPicker } from './build-picker';
import { closestSeries } from './closest-series';
import { harmonicMarks } from './harmonic-marks';
import { idsOf, spectrumQuery, spectrumViewOf } from './overlay-address';
import { overlayBuilds } from './overlay-builds';
import { OverlaySweeps } from './overlay-sweeps';
import { overlayPicture } from './overlay-traces';
import { problemOfFrames } from './problem-of-frames';

/** Chosen builds over the limit lines, in one series: by itself the one in which the newest of them comes closest to the limit. */
@Component({
  selector: 'app-overlay-tab',
  imports: [
    BuildPicker,
    EmptyState,
    MatButton,
    MatCheckbox,
    MatFormFieldModule,
    MatSelectModule,
    NothingMeasured,
    OverlaySweeps,
    ProblemBanner,
    SeriesFilter,
    Skeleton,
    SpectrumChart,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './overlay-tab.html',
  styleUrl: '../chart-tab.scss',
})
export class OverlayTab {
  private readonly address = inject(AddressQuery);
  protected readonly view = inject(ProductInView);

  readonly state = input<string>();
  readonly line = input<string>();
  readonly detector = input<string>();
  readonly builds = input<string>();
  readonly sweeps = input<string>();
  /** `lines` and `detectors` with commas between: what is drawn together instead of the closest one alone. */
  readonly together = input<string>();
  readonly background = input<string>();
  readonly harmonics = input<string>();
  readonly fromHz = input<string>();
  readonly toHz = input<string>();
  readonly pins = input<string>();

  protected readonly sweepIds = computed(() => idsOf(this.sweeps()));
  /** Sweeps that an address names stand alone unless it names builds as well. */
  protected readonly picked = computed(() => {
    const asked = this.builds() === undefined && this.sweepIds().length === 0 ? undefined : idsOf(this.builds());
    return overlayBuilds(this.view.builds() ?? [], asked);
  });
  private readonly leadId = computed(() => this.picked().lead?.id);

  protected readonly choice = computed(() =>
    seriesChoice({ state: this.state(), line: this.line(), detector: this.detector() }, this.view.product()),
  );
  protected readonly allLines = computed(() => this.togetherHas('lines'));
  protected readonly allDetectors = computed(() => this.togetherHas('detectors'));

  private readonly leadSweeps = httpResource<SweepPage>(() => {
    const build = this.leadId();
    const params = { ...this.view.apiTeam(), product: this.view.key(), kind: 'product', limit: 200 };
    return build === undefined ? undefined : { url: '/api/v1/sweeps', params: { ...params, build } };
  });
  protected readonly closest = computed(() =>
    this.leadSweeps.hasValue() ? closestSeries(this.leadSweeps.value().sweeps, this.choice()) : null,
  );
  /** What is drawn: the closest series, opened where lines or detectors stand together. */
  protected readonly series = computed(() => {
    const closest = this.closest() ?? this.choice();
    const { line, detector, ...rest } = closest;
    return {
      ...rest,
      ...(line && !this.allLines() && { line }),
      ...(detector && !this.allDetectors() && { detector }),
    };
  });
  protected readonly words = computed(() => seriesWords(this.series()));

  private readonly answer = httpResource.arrayBuffer(() => {
    const builds = this.picked().chosen.map(({ id }) => id);
    const isReady = this.view.builds() !== undefined && (this.leadId() === undefined || !this.leadSweeps.isLoading());
    if (!isReady || builds.length + this.sweepIds().length === 0) return undefined;
    return {
      url: '/api/v1/overlay',
      params: {
        ...this.view.apiTeam(),
        ...this.series(),
        product: this.view.key(),
        builds: builds.join(','),
        sweeps: this.sweepIds().join(','),
        kind: this.background() === 'on' ? 'background' : 'product',
      },
    };
  });
  private readonly frames = keptValue(this.answer);
  protected readonly picture = computed(() => {
    const bytes = this.frames();
    const reference = this.view.product()?.reference?.buildId;
    return bytes && overlayPicture(decodeFrames<OverlayTrace>(bytes), this.leadId(), reference);
  });
  private readonly sweepsProblem = problemOfResource(this.leadSweeps);
  protected readonly problem = computed(() => {
    const error = this.answer.error();
    return error ? problemOfFrames(error) : (this.view.buildsProblem() ?? this.sweepsProblem());
  });

  private readonly leadBuild = httpResource<BuildView>(() => {
    const id = this.leadId();
    return id === undefined ? undefined : { url: `${this.view.api()}/builds/${id}`, params: this.view.apiTeam() };
  });
  protected readonly stages = computed(() => (this.leadBuild.hasValue() ? this.leadBuild.value().switching : []));
  protected readonly stage = computed(() => this.stages().find(({ stage }) => stage === this.harmonics()));
  protected readonly spectrumView = computed(() => spectrumViewOf(this.fromHz(), this.toHz(), this.pins()));
  protected readonly marks = computed(() => {
    const stage = this.stage();
    return stage ? harmonicMarks(stage, { ...FULL_RANGE_HZ, ...this.spectrumView() }) : [];
  });

  /** NOTE: a select shows no text for null, which it takes for "nothing chosen". */
  protected readonly any = '';

  protected chooseBuilds(ids: number[]): void {
    this.address.patch({ builds: ids.join(',') });
  }

  protected showDefault(): void {
    this.address.patch({ builds: null, sweeps: null });
  }

  protected dropSweeps(): void {
    this.address.patch({ sweeps: null });
  }

  protected standTogether(what: 'lines' | 'detectors', isTogether: boolean): void {
    const others = (this.together() ?? '').split(',').filter((name) => name !== '' && name !== what);
    const names = isTogether ? [...others, what] : others;
    this.address.patch({ together: names.join(',') || null });
  }

  protected showBackground(isShown: boolean): void {
    this.address.patch({ background: isShown ? 'on' : null });
  }

  protected showHarmonics(stage: string | null): void {
    this.address.patch({ harmonics: stage });
  }

  protected keepView(view: SpectrumView): void {
    this.address.patch(spectrumQuery(view, FULL_RANGE_HZ));
  }

  protected reload(): void {
    this.leadSweeps.reload();
    this.answer.reload();
  }

  private togetherHas(what: 'lines' | 'detectors'): boolean {
    return (this.together() ?? '').split(',').includes(what);
  }
}
