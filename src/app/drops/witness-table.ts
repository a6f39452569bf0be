import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { DropView } from '@shared/contracts/drops';
import { FrequencyPipe } from '../ui/frequency';
import { MarginValue } from '../ui/margin-value';
import { SignedDecibelsPipe } from '../ui/signed-decibels';
import { formatChance } from './format-chance';
import { changeScale } from './change-scale';
import { IntervalBar } from './interval-bar';

/** The series that lost, with the figures of each comparison. */
@Component({
  selector: 'app-witness-table',
  imports: [FrequencyPipe, IntervalBar, MarginValue, RouterLink, SignedDecibelsPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame">
      <table class="dense-table">
        <caption class="visually-hidden">
          Series that lost margin
        </caption>
        <thead>
          <tr>
            <th scope="col">Series</th>
            <th scope="col" class="number">Change</th>
            <th scope="col" class="number">90 % interval</th>
            <th scope="col" class="bar">Against the threshold (dashed)</th>
            <th scope="col" class="number">Adjusted p</th>
            <th scope="col" class="number">Runs, build</th>
            <th scope="col" class="number">Runs, reference</th>
            <th scope="col" class="number">Least margin</th>
            <th scope="col" class="number">At</th>
          </tr>
        </thead>
        <tbody>
          @for (row of rows(); track row.series) {
            @let judgement = row.judgement;
            <tr>
              <th scope="row">{{ row.series }}</th>
              <td class="number">
                <strong>{{ judgement.differenceDb | signedDecibels }}</strong>
              </td>
              <td class="number">{{ row.interval }}</td>
              <td class="bar">
                @if (judgement.interval; as interval) {
                  <app-interval-bar
                    [differenceDb]="judgement.differenceDb ?? 0"
                    [interval]="interval"
                    [thresholdDb]="judgement.thresholdDb"
                    [scale]="scale()"
                  />
                }
              </td>
              <td class="number">{{ row.chance }}</td>
              <td class="number">{{ row.buildRuns }}</td>
              <td class="number">{{ row.referenceRuns }}</td>
              <td class="number">
                <app-margin-value
                  [marginDb]="judgement.worst?.marginDb ?? null"
                  [targetMarginDb]="judgement.targetMarginDb"
                />
              </td>
              <td class="number">
                @if (judgement.worst; as worst) {
                  <a [routerLink]="['/t', teamKey(), 'sweeps', worst.sweepId]" title="Open the deciding sweep">{{
                    worst.frequencyHz | frequency
                  }}</a>
                }
              </td>
            </tr>
          }
        </tbody>
      </table>
    </div>
  `,
  styles: `
    .table-frame {
      position: relative;
    }
    .dense-table:not(.mat-mdc-table) tbody th {
      height: auto;
      color: var(--sl-ink);
      font-size: 13px;
      font-weight: 500;
    }
    .bar {
      width: 26%;
      min-width: 180px;
    }
    @media (max-width: 719px) {
      .bar {
        display: none;
      }
    }
  `,
})
export class WitnessTable {
  readonly drop = input.required<DropView>();
  readonly teamKey = input.required<string>();

  protected readonly scale = computed(() =>
    changeScale(this.drop().evidence.witnesses.map(({ judgement }) => judgement)),
  );
  protected readonly rows = computed(() =>
    this.drop().evidence.witnesses.map(({ line, detector, judgement }) => ({
      series: `${line} ${detector}`,
      judgement,
      interval:
        judgement.interval
          ?.map((endDb) => endDb.toFixed(1))
          .join(' to ')
          .concat(' dB') ?? '',
      chance: judgement.adjustedP === null ? '' : formatChance(judgement.adjustedP),
      buildRuns: runs(judgement.buildRuns),
      referenceRuns: runs(judgement.referenceRuns),
    })),
  );
}

/** One run decides little, so it is named and not counted. */
function runs(count: number): string {
  return count === 1 ? 'single' : String(count);
}
