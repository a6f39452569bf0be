import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { TraceSwatch } from './trace-swatch';
import type { TrendLook } from './trend-option';
import type { TrendSeries } from './trend-types';

@Component({
  selector: 'app-trend-legend',
  imports: [TraceSwatch],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (entry of entries(); track entry.label) {
      <span><app-trace-swatch [look]="entry.look" />{{ entry.label }}</span>
    }
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 16px;
      font-size: 12px;
      line-height: 16px;
    }
    span {
      display: inline-flex;
      gap: 6px;
      align-items: center;
    }
  `,
})
export class TrendLegend {
  readonly series = input.required<readonly TrendSeries[]>();
  readonly looks = input.required<readonly TrendLook[]>();

  protected readonly entries = computed(() =>
    this.series().map(({ label }, i) => ({
      label,
      look: { ...this.looks()[i], widthPx: 1.6, dash: 'solid' as const },
    })),
  );
}
