import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { formatDecibels } from '@shared/units/format-decibels';
import { sparklineShape } from './sparkline-shape';

const WIDTH = 120;
const HEIGHT = 32;

/** Worst margin over the last builds as a small line: gaps where nothing was measured, target dashed, limit solid. */
@Component({
  selector: 'app-sparkline',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let shape = this.shape();
    <svg role="img" [attr.viewBox]="viewBox" [attr.aria-label]="label()">
      <line class="limit" x1="0" [attr.x2]="width" [attr.y1]="shape.limitY" [attr.y2]="shape.limitY" />
      @if (shape.targetY !== null) {
        <line class="target" x1="0" [attr.x2]="width" [attr.y1]="shape.targetY" [attr.y2]="shape.targetY" />
      }
      @for (path of shape.paths; track $index) {
        <path [attr.d]="path" />
      }
      @for (dot of shape.dots; track $index) {
        <circle r="1.8" [attr.cx]="dot.x" [attr.cy]="dot.y" />
      }
      @if (shape.last; as last) {
        <circle r="2.6" [class.over]="last.isOver" [attr.cx]="last.x" [attr.cy]="last.y" />
      }
    </svg>
  `,
  styles: `
    :host {
      display: inline-block;
      width: 120px;
      height: 32px;
    }
    svg {
      display: block;
      width: 100%;
      height: 100%;
      overflow: visible;
    }
    path {
      fill: none;
      stroke: var(--sl-accent);
      stroke-linejoin: round;
      stroke-width: 1.5;
    }
    circle {
      fill: var(--sl-accent);
    }
    circle.over {
      fill: var(--sl-margin-text-over);
    }
    .limit {
      stroke: var(--sl-trace-limit);
      stroke-width: 1;
    }
    .target {
      stroke: var(--sl-outline);
      stroke-dasharray: 3 3;
      stroke-width: 1;
    }
  `,
})
export class Sparkline {
  /** Worst margin of each build in dB, oldest first; null where nothing was measured. */
  readonly marginsDb = input.required<readonly (number | null)[]>();
  readonly targetMarginDb = input<number | null>(null);

  protected readonly width = WIDTH;
  protected readonly viewBox = `0 0 ${WIDTH} ${HEIGHT}`;
  protected readonly shape = computed(() => sparklineShape(this.marginsDb(), this.targetMarginDb(), WIDTH, HEIGHT));
  protected readonly label = computed(() => {
    const measured = this.marginsDb().filter((marginDb) => marginDb !== null);
    if (measured.length === 0) return 'Trend: no build measured';
    const [first, last] = [measured[0], measured[measured.length - 1]];
    return `Trend of ${measured.length} measured builds: from ${formatDecibels(first)} to ${formatDecibels(last)} of margin`;
  });
}
