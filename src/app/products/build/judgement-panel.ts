import { ChangeDetectionStrategy, Component, computed, input, linkedSignal } from '@angular/core';
import { SignedDecibelsPipe } from '../../ui/signed-decibels';
import { VerdictChip } from '../../ui/verdict-chip';
import { JudgementDetail } from './judgement-detail';
import type { BandVerdict } from './verdict-rows';

/** All series of one band and state; the chosen one is explained below. */
@Component({
  selector: 'app-judgement-panel',
  imports: [JudgementDetail, SignedDecibelsPipe, VerdictChip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="series" role="group" aria-label="Series">
      @for (one of series(); track $index) {
        <button type="button" [attr.aria-pressed]="$index === chosen()" (click)="chosen.set($index)">
          <span class="name">{{ one.line }}, {{ one.detector }}</span>
          <app-verdict-chip [verdict]="one.verdict" [isOverLimit]="one.isOverLimit" />
          <span class="number">{{ one.differenceDb | signedDecibels }}</span>
        </button>
      }
    </div>
    <app-judgement-detail [judgement]="judgement()" [methodVersion]="methodVersion()" />
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
    }
    .series {
      display: flex;
      flex-wrap: wrap;
      gap: 8px;
    }
    button {
      display: inline-flex;
      gap: 8px;
      align-items: center;
      padding: 5px 10px;
      border: 1px solid var(--sl-hairline);
      border-radius: 6px;
      background: var(--sl-surface);
      color: var(--sl-ink);
      font: inherit;
      font-size: 13px;
      cursor: pointer;
    }
    button[aria-pressed='true'] {
      border-color: var(--sl-accent);
      box-shadow: inset 0 -2px var(--sl-accent);
    }
    .name {
      font-weight: 500;
    }
  `,
})
export class JudgementPanel {
  /** The one the verdict rests on first. */
  readonly series = input.required<readonly BandVerdict[]>();
  readonly methodVersion = input.required<number | null>();

  protected readonly chosen = linkedSignal<readonly BandVerdict[], number>({
    source: this.series,
    computation: () => 0,
  });
  protected readonly judgement = computed(() => this.series()[this.chosen()].judgement);
}
