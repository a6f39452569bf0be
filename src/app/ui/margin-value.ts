import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { formatDecibels } from '@shared/units/format-decibels';

type Standing = 'clear' | 'tight' | 'over' | 'unmeasured';

/** A margin with its unit; over the limit and below the target it carries a glyph and a colour. */
@Component({
  selector: 'app-margin-value',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'number', '[class]': 'standing()', '[attr.title]': 'words()' },
  template: `
    @switch (standing()) {
      @case ('over') {
        <mat-icon svgIcon="over" />
      }
      @case ('tight') {
        <mat-icon svgIcon="belowTarget" />
      }
    }
    {{ text() }}<span class="visually-hidden">{{ words() }}</span>
  `,
  styles: `
    :host {
      font-weight: 500;
      white-space: nowrap;
    }
    mat-icon {
      width: 14px;
      height: 14px;
      margin-inline-end: 2px;
      vertical-align: -2px;
      line-height: 0;
    }
    :host(.over) {
      color: var(--sl-margin-text-over);
    }
    :host(.tight) {
      color: var(--sl-margin-text-tight);
    }
    :host(.unmeasured) {
      color: var(--sl-ink-muted);
      font-weight: 400;
    }
  `,
})
export class MarginValue {
  /** Margin to the limit in dB; null where nothing was measured. */
  readonly marginDb = input.required<number | null>();
  readonly targetMarginDb = input<number>();

  protected readonly standing = computed((): Standing => {
    const marginDb = this.marginDb();
    if (marginDb === null) return 'unmeasured';
    if (marginDb < 0) return 'over';
    return marginDb < (this.targetMarginDb() ?? 0) ? 'tight' : 'clear';
  });
  protected readonly text = computed(() => {
    const marginDb = this.marginDb();
    return marginDb === null ? 'not measured' : formatDecibels(marginDb);
  });
  protected readonly words = computed(() => {
    const standing = this.standing();
    if (standing === 'over') return 'over limit';
    return standing === 'tight' ? `below the target of ${formatDecibels(this.targetMarginDb() ?? 0)}` : null;
  });
}
