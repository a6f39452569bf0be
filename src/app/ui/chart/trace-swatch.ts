import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { TraceLook } from './trace-look';

const MARKERS: Record<TraceLook['symbol'], string> = {
  circle: 'M14 6 m-3 0 a3 3 0 1 0 6 0 a3 3 0 1 0 -6 0',
  triangle: 'M14 2.5 L17.5 9 H10.5 Z',
  rect: 'M11 3 H17 V9 H11 Z',
  diamond: 'M14 2 L18 6 L14 10 L10 6 Z',
  roundRect: 'M12 3 H16 Q17 3 17 4 V8 Q17 9 16 9 H12 Q11 9 11 8 V4 Q11 3 12 3 Z',
};

/** A short piece of a trace as it is drawn: colour, dash, marker. */
@Component({
  selector: 'app-trace-swatch',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <svg viewBox="0 0 28 12" width="28" height="12" aria-hidden="true">
      @if (isFill()) {
        <rect width="28" height="12" rx="2" [style.fill]="look().colour" />
      } @else {
        <path
          d="M0 6 H28"
          [style.stroke]="look().colour"
          [style.stroke-width]="look().widthPx + 0.4"
          [style.stroke-dasharray]="dash()"
        />
        <path class="marker" [attr.d]="marker()" [style.stroke]="look().colour" />
      }
    </svg>
  `,
  styles: `
    :host {
      display: inline-flex;
    }
    .marker {
      fill: var(--sl-surface);
      stroke-width: 1.4;
    }
  `,
})
export class TraceSwatch {
  readonly look = input.required<TraceLook>();
  readonly isFill = input(false);

  protected readonly dash = computed(() => {
    const { dash } = this.look();
    return dash === 'solid' ? null : dash.join(' ');
  });
  protected readonly marker = computed(() => MARKERS[this.look().symbol]);
}
