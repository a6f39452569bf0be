import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { formatDecibels } from '@shared/units/format-decibels';
import { DecibelsPipe } from '../ui/decibels';
import { type MarginScale, percentAt } from './margin-scale';

/**
 * How far the product stands from its limit: a bar from the limit to the worst margin, the target as a dashed mark and
 * the build before as an open ring. All products share one scale, so that bars compare.
 */
@Component({
  selector: 'app-margin-reach',
  imports: [DecibelsPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'img', '[attr.aria-label]': 'label()' },
  template: `
    @if (bar(); as bar) {
      <span class="bar" [class]="standing()" [style.left.%]="bar.left" [style.width.%]="bar.width"></span>
    } @else {
      <span class="bar unmeasured" [style.left.%]="limitAt()" [style.right.%]="0"></span>
    }
    <span class="target" [style.left.%]="targetAt()"></span>
    <span class="target-text number" [style.left.%]="targetAt()">target {{ targetMarginDb() | decibels }}</span>
    <span class="limit" [style.left.%]="limitAt()"></span>
    @if (previousAt() !== null) {
      <span class="previous" [style.left.%]="previousAt()"></span>
    }
  `,
  styles: `
    :host {
      position: relative;
      display: block;
      height: 38px;
      min-width: 160px;
    }
    :host::before {
      content: '';
      position: absolute;
      inset: 9px 0 auto;
      border-top: 1px solid var(--sl-hairline);
    }
    span {
      position: absolute;
      top: 10px;
    }
    .bar {
      height: 10px;
      margin-top: -5px;
      border-radius: 2px;
      background: var(--sl-margin-ample);
    }
    .tight {
      border: 1px solid var(--sl-margin-text-tight);
      background: var(--sl-margin-tight);
    }
    .over {
      background: repeating-linear-gradient(-45deg, transparent 0 4px, var(--sl-margin-hatch) 4px 5px)
        var(--sl-margin-over);
    }
    .unmeasured {
      background: radial-gradient(var(--sl-margin-unmeasured-dot) 1px, transparent 1px) 0 0 / 6px 6px
        var(--sl-margin-unmeasured);
    }
    .limit {
      width: 3px;
      height: 20px;
      margin: -10px 0 0 -1.5px;
      background: var(--sl-trace-limit);
    }
    .target {
      height: 20px;
      margin: -10px 0 0 -0.5px;
      border-inline-start: 1px dashed var(--sl-ink-muted);
    }
    .target-text {
      top: 20px;
      color: var(--sl-ink-muted);
      font-size: 12px;
      line-height: 18px;
      white-space: nowrap;
    }
    .previous {
      width: 9px;
      height: 9px;
      margin: -4.5px 0 0 -4.5px;
      border: 2px solid var(--sl-ink);
      border-radius: 50%;
      background: var(--sl-surface);
    }
  `,
})
export class MarginReach {
  readonly marginDb = input.required<number | null>();
  readonly previousDb = input.required<number | null>();
  readonly targetMarginDb = input.required<number>();
  readonly scale = input.required<MarginScale>();

  protected readonly limitAt = computed(() => percentAt(0, this.scale()));
  protected readonly targetAt = computed(() => percentAt(this.targetMarginDb(), this.scale()));
  protected readonly previousAt = computed(() => {
    const previousDb = this.previousDb();
    return previousDb === null ? null : percentAt(previousDb, this.scale());
  });
  protected readonly bar = computed(() => {
    const marginDb = this.marginDb();
    if (marginDb === null) return null;
    const ends = [this.limitAt(), percentAt(marginDb, this.scale())].sort((a, b) => a - b);
    return { left: ends[0], width: ends[1] - ends[0] };
  });
  protected readonly standing = computed(() => {
    const marginDb = this.marginDb() ?? 0;
    return marginDb < 0 ? 'over' : marginDb < this.targetMarginDb() ? 'tight' : '';
  });
  protected readonly label = computed(() => {
    const [marginDb, previousDb] = [this.marginDb(), this.previousDb()];
    const now = marginDb === null ? 'Not measured' : `Margin ${formatDecibels(marginDb)}`;
    const before = previousDb === null ? '' : `, build before ${formatDecibels(previousDb)}`;
    return `${now}, target ${formatDecibels(this.targetMarginDb())}${before}`;
  });
}
