import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { DROP_STATE_WORDS, type DropState } from '@shared/contracts/drop-states';
import { DROP_STATE_LOOKS } from './drop-state-look';

/** How far a drop is worked on, as word, glyph and colour. */
@Component({
  selector: 'app-drop-state-chip',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<span [class]="look().tone"><mat-icon [svgIcon]="look().icon" />{{ word() }}</span>`,
  styles: `
    span {
      display: inline-flex;
      gap: 5px;
      align-items: center;
      padding: 2px 8px 2px 6px;
      border: 1px solid transparent;
      border-radius: 11px;
      font-size: 12px;
      font-weight: 500;
      line-height: 16px;
      white-space: nowrap;
    }
    mat-icon {
      width: 14px;
      height: 14px;
    }
    .alarm {
      border-color: var(--sl-lost);
      color: var(--sl-lost);
    }
    .work {
      border-color: var(--sl-unsure);
      color: var(--sl-unsure);
    }
    .good {
      border-color: var(--sl-gained);
      color: var(--sl-gained);
    }
    .calm {
      border-color: var(--sl-outline);
      color: var(--sl-held);
    }
    .gone {
      border: 1px dashed var(--sl-outline);
      color: var(--sl-ink-muted);
    }
  `,
})
export class DropStateChip {
  readonly state = input.required<DropState>();

  protected readonly look = computed(() => DROP_STATE_LOOKS[this.state()]);
  protected readonly word = computed(() => DROP_STATE_WORDS[this.state()]);
}
