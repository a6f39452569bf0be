import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { formatDecibels } from '@shared/units/format-decibels';
import { type MarginScale, percentAt } from './margin-scale';

/**
 * A loss drawn against what is left: an open ring where the margin was, a filled dot where it is, the limit as a heavy
 * mark and the target dashed. On one scale for all rows a small margin is seen before a big change.
 */
@Component({
  selector: 'app-margin-slide',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'img', '[attr.aria-label]': 'words()' },
  template: `
    <span class="beyond" [style.width.%]="limitAt()"></span>
    <span class="target" [style.left.%]="targetAt()"></span>
    <span class="limit" [style.left.%]="limitAt()"></span>
    <span class="way" [style.left.%]="wayFrom()" [style.width.%]="wayLength()"></span>
    <span class="before" [style.left.%]="beforeAt()"></span>
    <span class="now" [class]="standing()" [style.left.%]="nowAt()"></span>
  `,
  styles: `
    :host {
      position: relative;
      display: block;
      height: 18px;
      min-width: 110px;
    }
    :host::before {
      content: '';
      position: absolute;
      inset: 50% 0 auto;
      border-top: 1px solid var(--sl-hairline);
    }
    span {
      position: absolute;
      top: 50%;
    }
    .beyond {
      left: 0;
      height: 18px;
      margin-top: -9px;
      background: repeating-linear-gradient(-45deg, transparent 0 4px, var(--sl-hairline) 4px 5px);
    }
    .limit {
      width: 3px;
      height: 18px;
      margin: -9px 0 0 -1.5px;
      background: var(--sl-trace-limit);
    }
    .target {
      height: 18px;
      margin: -9px 0 0 -0.5px;
      border-inline-start: 1px dashed var(--sl-ink-muted);
    }
    .way {
      height: 2px;
      margin-top: -1px;
      background: var(--sl-ink-muted);
    }
    .before,
    .now {
      width: 9px;
      height: 9px;
      margin: -4.5px 0 0 -4.5px;
      border: 2px solid var(--sl-ink-muted);
      border-radius: 50%;
      background: var(--sl-surface);
    }
    .now {
      width: 11px;
      height: 11px;
      margin: -5.5px 0 0 -5.5px;
      border-color: var(--sl-ink);
      background: var(--sl-ink);
    }
    .tight {
      border-color: var(--sl-margin-text-tight);
      background: var(--sl-margin-text-tight);
    }
    .over {
      border-color: var(--sl-margin-text-over);
      border-radius: 2px;
      background: var(--sl-margin-text-over);
    }
  `,
})
export class MarginSlide {
  readonly beforeDb = input.required<number>();
  readonly nowDb = input.required<number>();
  readonly targetMarginDb = input.required<number>();
  readonly scale = input.required<MarginScale>();

  protected readonly limitAt = computed(() => percentAt(0, this.scale()));
  protected readonly targetAt = computed(() => percentAt(this.targetMarginDb(), this.scale()));
  protected readonly beforeAt = computed(() => percentAt(this.beforeDb(), this.scale()));
  protected readonly nowAt = computed(() => percentAt(this.nowDb(), this.scale()));
  protected readonly wayFrom = computed(() => Math.min(this.beforeAt(), this.nowAt()));
  protected readonly wayLength = computed(() => Math.abs(this.beforeAt() - this.nowAt()));
  protected readonly standing = computed(() =>
    this.nowDb() < 0 ? 'over' : this.nowDb() < this.targetMarginDb() ? 'tight' : 'clear',
  );
  protected readonly words = computed(
    () => `Margin from about ${formatDecibels(this.beforeDb())} to ${formatDecibels(this.nowDb())}`,
  );
}
