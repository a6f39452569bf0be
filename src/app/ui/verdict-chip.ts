import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { Verdict } from '@shared/judging/verdict';
import { CHIP_LOOKS } from './chip-looks';

/** A verdict as word, glyph and colour; "over limit" stands beside it as a chip of its own, whatever the verdict. */
@Component({
  selector: 'app-verdict-chip',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (look of looks(); track look.word) {
      <span class="chip" [class]="look.status"><mat-icon [svgIcon]="look.icon" />{{ look.word }}</span>
    }
  `,
  styles: `
    :host {
      display: inline-flex;
      gap: 4px;
      vertical-align: middle;
    }
    .chip {
      display: inline-flex;
      gap: 4px;
      align-items: center;
      height: 22px;
      padding: 0 8px 0 6px;
      border-radius: 4px;
      font-size: 12px;
      font-weight: 500;
      line-height: 22px;
      white-space: nowrap;
    }
    mat-icon {
      width: 14px;
      height: 14px;
      color: inherit;
    }
    .lost {
      background: var(--sl-lost-ground);
      color: var(--sl-lost);
    }
    .gained {
      background: var(--sl-gained-ground);
      color: var(--sl-gained);
    }
    .held {
      background: var(--sl-held-ground);
      color: var(--sl-held);
    }
    .unsure {
      background: var(--sl-unsure-ground);
      color: var(--sl-unsure);
    }
    .over {
      background: var(--sl-over-ground);
      color: var(--sl-over);
    }
    .unjudged {
      padding-inline: 7px;
      border: 1px dashed var(--sl-outline);
      color: var(--sl-ink-muted);
      line-height: 20px;
    }
  `,
})
export class VerdictChip {
  /** Null: not judged yet. */
  readonly verdict = input.required<Verdict | null>();
  readonly isOverLimit = input(false);

  protected readonly looks = computed(() => {
    const verdict = CHIP_LOOKS[this.verdict() ?? 'unjudged'];
    return this.isOverLimit() ? [CHIP_LOOKS.over, verdict] : [verdict];
  });
}
