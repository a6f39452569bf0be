import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { BandJudgement } from '@shared/judging/band-judgement';
import { DecibelsPipe } from '../../ui/decibels';
import { FrequencyPipe } from '../../ui/frequency';
import { SignedDecibelsPipe } from '../../ui/signed-decibels';
import { ProductInView } from '../product-in-view';
import { ProbabilityPipe } from './probability';

/** The adjusted p that a call takes: CALLED_P of shared/judging, written again because its file brings a numeric library. */
const CALLED_P = 0.01;

/** Every number a verdict of one series was decided on, its reasons, and what would settle it. */
@Component({
  selector: 'app-judgement-detail',
  imports: [DecibelsPipe, FrequencyPipe, ProbabilityPipe, RouterLink, SignedDecibelsPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './judgement-detail.html',
  styleUrl: './judgement-detail.scss',
})
export class JudgementDetail {
  protected readonly view = inject(ProductInView);

  readonly judgement = input.required<BandJudgement>();
  readonly methodVersion = input.required<number | null>();

  protected readonly calledP = CALLED_P;
  protected readonly sides = computed(() => {
    const {
      worst,
      referenceWorst,
      meanMarginDb,
      referenceMeanMarginDb,
      buildSweepIds,
      referenceSweepIds,
      buildRuns,
      referenceRuns,
    } = this.judgement();
    return [
      { name: 'This build', runs: buildRuns, meanDb: meanMarginDb, worst, sweepIds: buildSweepIds },
      {
        name: 'Reference',
        runs: referenceRuns,
        meanDb: referenceMeanMarginDb,
        worst: referenceWorst,
        sweepIds: referenceSweepIds,
      },
    ];
  });
}
