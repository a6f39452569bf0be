import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { formatSignedDecibels } from '@shared/units/format-decibels';
import { changePercentAt, type ChangeScale } from './change-scale';

/** A change with its 90 % interval against no change (solid) and the threshold of a loss (dashed). */
@Component({
  selector: 'app-interval-bar',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'img', '[attr.aria-label]': 'words()' },
  template: `
    <span class="held" [style.left.%]="thresholdAt()" [style.width.%]="zeroAt() - thresholdAt()"></span>
    <span class="threshold" [style.left.%]="thresholdAt()"></span>
    <span class="zero" [style.left.%]="zeroAt()"></span>
    <span class="interval" [style.left.%]="fromAt()" [style.width.%]="toAt() - fromAt()"></span>
    <span class="change" [style.left.%]="changeAt()"></span>
  `,
  styles: `
    :host {
      position: relative;
      display: block;
      height: 18px;
    }
    span {
      position: absolute;
      top: 0;
      height: 18px;
    }
    .held {
      background: var(--sl-held-ground);
    }
    .threshold {
      border-inline-start: 1px dashed var(--sl-ink-muted);
    }
    .zero {
      border-inline-start: 1px solid var(--sl-ink);
    }
    .interval {
      top: 8px;
      height: 2px;
      background: var(--sl-lost);
    }
    .interval::before,
    .interval::after {
      content: '';
      position: absolute;
      top: -4px;
      height: 10px;
      border-inline-start: 2px solid var(--sl-lost);
    }
    .interval::after {
      right: 0;
    }
    .change {
      top: 4px;
      width: 10px;
      height: 10px;
      margin-left: -5px;
      border-radius: 50%;
      background: var(--sl-lost);
    }
  `,
})
export class IntervalBar {
  readonly differenceDb = input.required<number>();
  readonly interval = input.required<readonly [number, number]>();
  readonly thresholdDb = input.required<number>();
  readonly scale = input.required<ChangeScale>();

  protected readonly zeroAt = computed(() => changePercentAt(0, this.scale()));
  protected readonly thresholdAt = computed(() => changePercentAt(-this.thresholdDb(), this.scale()));
  protected readonly changeAt = computed(() => changePercentAt(this.differenceDb(), this.scale()));
  protected readonly fromAt = computed(() => changePercentAt(this.interval()[0], this.scale()));
  protected readonly toAt = computed(() => changePercentAt(this.interval()[1], this.scale()));
  protected readonly words = computed(
    () =>
      `${formatSignedDecibels(this.differenceDb())}, between ${formatSignedDecibels(this.interval()[0])} and ` +
      `${formatSignedDecibels(this.interval()[1])}; the threshold is ${formatSignedDecibels(-this.thresholdDb())}`,
  );
}
