import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { FAR_OVER_DB, PLENTY_ABOVE_TARGET_DB } from './margin-ramp';

/** The margin ramp with its two steps, the hatch over the limit and the dots of what was not measured. */
@Component({
  selector: 'app-margin-ramp-legend',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="scale" role="img" [attr.aria-label]="label()">
      <div class="bar" [style.background]="gradient()"><div class="hatch" [style.width.%]="limitAt()"></div></div>
      <div class="texts number">
        <span [style.left.%]="0">over</span>
        <span [style.left.%]="limitAt()">0</span>
        @if (targetMarginDb() > 0) {
          <span [style.left.%]="targetAt()">{{ targetMarginDb() }} target</span>
        }
        <span class="end">{{ targetMarginDb() + 20 }} dB</span>
      </div>
    </div>
    <span class="unmeasured"><span class="dots"></span>not measured</span>
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 16px;
      align-items: center;
      font-size: 12px;
      line-height: 16px;
    }
    .scale {
      width: 260px;
    }
    .bar {
      height: 12px;
      border-radius: 2px;
      overflow: hidden;
    }
    .hatch {
      height: 100%;
      background: repeating-linear-gradient(-45deg, transparent 0 3px, var(--sl-margin-hatch) 3px 4px);
      opacity: 0.75;
    }
    .texts {
      position: relative;
      height: 16px;
      color: var(--sl-ink-muted);
    }
    .texts span {
      position: absolute;
      white-space: nowrap;
    }
    .texts .end {
      right: 0;
    }
    .unmeasured {
      display: inline-flex;
      gap: 6px;
      align-items: center;
      color: var(--sl-ink-muted);
    }
    .dots {
      width: 18px;
      height: 12px;
      border-radius: 2px;
      background: radial-gradient(var(--sl-margin-unmeasured-dot) 1px, transparent 1px) 0 0 / 6px 6px
        var(--sl-margin-unmeasured);
    }
  `,
})
export class MarginRampLegend {
  readonly targetMarginDb = input.required<number>();

  private readonly spanDb = computed(() => FAR_OVER_DB + this.targetMarginDb() + PLENTY_ABOVE_TARGET_DB);
  protected readonly limitAt = computed(() => (100 * FAR_OVER_DB) / this.spanDb());
  protected readonly targetAt = computed(() => (100 * (FAR_OVER_DB + this.targetMarginDb())) / this.spanDb());
  protected readonly gradient = computed(() => {
    const [limit, target] = [this.limitAt(), this.targetAt()];
    const stops = [
      `far-over) 0%`,
      `over) ${limit}%`,
      `tight) ${limit}%`,
      `near) ${target}%`,
      `clear) ${target}%`,
      `ample) ${(target + 100) / 2}%`,
      `plenty) 100%`,
    ];
    return `linear-gradient(to right, ${stops.map((stop) => `var(--sl-margin-${stop}`).join(', ')})`;
  });
  protected readonly label = computed(
    () =>
      `Colours of the margin: coral and hatched over the limit, sand from 0 to the target of ${this.targetMarginDb()} dB, ` +
      `blue above it, the deeper the more.`,
  );
}
