import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

/** Grey lines, or one block of a given height, that hold the place of content on its way. */
@Component({
  selector: 'app-skeleton',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'status', '[attr.aria-label]': 'label()' },
  template: `
    @if (heightPx(); as height) {
      <span class="bar" [style.height.px]="height"></span>
    } @else {
      @for (width of widths(); track $index) {
        <span class="bar" [style.width.%]="width"></span>
      }
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
    }
    .bar {
      display: block;
      height: 14px;
      border-radius: 4px;
      background: var(--sl-surface-highest);
      animation: breathe 1.6s ease-in-out infinite;
    }
    @keyframes breathe {
      50% {
        opacity: 0.45;
      }
    }
  `,
})
export class Skeleton {
  readonly label = input('Loading');
  readonly lines = input(4);
  /** Height of one block, px, for charts and cards; lines are left out then. */
  readonly heightPx = input<number>();

  protected readonly widths = computed(() =>
    Array.from({ length: this.lines() }, (_, line) => 96 - ((line * 37) % 45)),
  );
}
