import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { DropView } from '@shared/contracts/drops';
import { findLimitSet } from '@shared/limits/limit-sets';
import { FrequencyPipe } from '../ui/frequency';
import { leadWitness } from './lead-witness';
import { targetWords } from './margin-words';
import { QuestionBlock } from './question-block';
import { buildName, isOverNow, standingWords } from './sighting-words';
import { SightingsTable } from './sightings-table';

/** Margin to the limit and to the target, and what may be said of meeting the limit. */
@Component({
  selector: 'app-left-block',
  imports: [FrequencyPipe, MatIcon, QuestionBlock, SightingsTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let judgement = this.lead();
    <app-question-block question="How much is left?">
      <p class="margin" [class.over]="isOver()">
        @if (isOver()) {
          <mat-icon svgIcon="over" />
        }
        {{ left() }}
      </p>
      <app-sightings-table [drop]="drop()" [teamKey]="teamKey()" />
      <ul>
        @if (judgement.worst; as worst) {
          <li>
            {{ raisedIn() }}: level <span class="number">{{ worst.levelDbuv.toFixed(1) }} dBµV</span>, limit
            <span class="number">{{ worst.limitDbuv.toFixed(1) }} dBµV</span> at {{ worst.frequencyHz | frequency }},
            found between the measured points: {{ limit() }}.
          </li>
        }
        <li>{{ target() }}</li>
        <li>{{ chance() }}</li>
      </ul>
    </app-question-block>
  `,
  styles: `
    .margin {
      display: flex;
      gap: 6px;
      align-items: center;
      font-size: 18px;
      line-height: 24px;
    }
    .over {
      color: var(--sl-margin-text-over);
    }
    mat-icon {
      width: 20px;
      height: 20px;
    }
    ul {
      display: grid;
      gap: 4px;
      max-width: 76ch;
      margin: 0;
      padding-inline-start: 18px;
    }
  `,
})
export class LeftBlock {
  readonly drop = input.required<DropView>();
  readonly teamKey = input.required<string>();

  protected readonly lead = computed(() => leadWitness(this.drop()).judgement);
  protected readonly isOver = computed(() => isOverNow(this.drop()));
  protected readonly left = computed(() => standingWords(this.drop()));
  protected readonly raisedIn = computed(() => buildName(this.drop()));
  protected readonly limit = computed(() => {
    const { limitSetKey, limitSetVersion } = this.drop().evidence;
    const title = findLimitSet(limitSetKey)?.title ?? limitSetKey;
    return `${title}, as of its version ${limitSetVersion} here`;
  });
  protected readonly target = computed(() => {
    const { latest, evidence } = this.drop();
    return `${buildName(latest)}: ${targetWords(latest.marginDb, evidence.targetMarginDb)}.`;
  });
  protected readonly chance = computed(() => {
    const { pConform } = this.lead();
    if (pConform !== null) {
      return `${this.raisedIn()}: chance of meeting the limit, by the team's own uncertainty, ${(100 * pConform).toFixed(0)} %.`;
    }
    return (
      'How likely the product meets the limit is not stated, for the team has entered no measurement uncertainty. ' +
      'In-house results indicate; only an accredited test shows.'
    );
  });
}
