import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { MatSlideToggle } from '@angular/material/slide-toggle';
import type { DropView, DropWitness } from '@shared/contracts/drops';
import type { Problem } from '@shared/contracts/problem';
import { SpectrumChart } from '../ui/chart/spectrum-chart';
import type { SpectrumView } from '../ui/chart/spectrum-types';
import { FrequencyPipe } from '../ui/frequency';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { seriesName } from './lead-witness';
import type { OverlayScene } from './overlay-scene';
import { QuestionBlock } from './question-block';

/** Band, frequency and harmonic of the worst point, and the build drawn over its reference under the limit. */
@Component({
  selector: 'app-where-block',
  imports: [
    FrequencyPipe,
    MatButtonToggleModule,
    MatSlideToggle,
    ProblemBanner,
    QuestionBlock,
    Skeleton,
    SpectrumChart,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './where-block.html',
  styleUrl: './where-block.scss',
})
export class WhereBlock {
  readonly drop = input.required<DropView>();
  readonly witness = input.required<DropWitness>();
  readonly scene = input.required<OverlayScene | undefined>();
  readonly problem = input<Problem>();
  readonly view = input.required<SpectrumView>();
  readonly isEveryRun = input.required<boolean>();

  readonly seriesChosen = output<string>();
  readonly runsChosen = output<boolean>();
  readonly viewChanged = output<SpectrumView>();

  protected readonly series = computed(() => seriesName(this.witness()));
  protected readonly choices = computed(() => this.drop().evidence.witnesses.map(seriesName));
  protected readonly runCount = computed(() => {
    const { buildRuns, referenceRuns } = this.witness().judgement;
    return buildRuns + referenceRuns;
  });
  protected readonly fileName = computed(() => `drop-${this.drop().id}-${this.series().replace(' ', '-')}`);
}
