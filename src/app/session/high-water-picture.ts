import { ChangeDetectionStrategy, Component } from '@angular/core';

const WIDTH = 900;
const HEIGHT = 700;

/** Decoration of the sign-in pages: eight builds one behind the other under the mark of their highest reach. */
@Component({
  selector: 'app-high-water-picture',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { 'aria-hidden': 'true' },
  template: `
    <svg [attr.viewBox]="'0 0 ' + width + ' ' + height" preserveAspectRatio="xMidYMid slice">
      <path class="mark" d="M0 168 H330 L620 232 H900" />
      @for (build of builds; track build.path) {
        <path class="build" [class.latest]="$last" [attr.d]="build.path" />
      }
    </svg>
  `,
  styles: `
    :host {
      overflow: hidden;
      background: var(--sl-ground);
    }
    svg {
      display: block;
      width: 100%;
      height: 100%;
      min-height: 100vh;
    }
    path {
      vector-effect: non-scaling-stroke;
    }
    .mark {
      fill: none;
      stroke: var(--sl-trace-limit);
      stroke-dasharray: 9 7;
      stroke-width: 2;
    }
    .build {
      fill: var(--sl-ground);
      stroke: var(--sl-trace-reference);
      stroke-width: 1;
    }
    .latest {
      stroke: var(--sl-accent);
      stroke-width: 2;
    }
  `,
})
export class HighWaterPicture {
  protected readonly width = WIDTH;
  protected readonly height = HEIGHT;
  protected readonly builds = Array.from({ length: 8 }, (_, build) => ({ path: outline(build) }));
}

/** A comb of peaks over a falling floor; each later build stands lower on the page and its comb is shifted a little. */
function outline(build: number): string {
  const base = 290 + build * 52;
  const spacing = 88 - build * 1.5;
  const points: string[] = [];
  for (let x = 0; x <= WIDTH; x += 3) {
    const nearest = Math.max(1, Math.round(x / spacing));
    const distance = (x - nearest * spacing) / 7;
    const peak = (125 / Math.sqrt(nearest)) * Math.exp(-distance * distance);
    const swell = 10 * Math.sin(x / 90 + build) + 5 * Math.sin(x / 31 + 2 * build);
    points.push(`${x} ${(base + x * 0.03 - peak - swell).toFixed(1)}`);
  }
  return `M0 ${HEIGHT + 20} L${points.join(' L')} L${WIDTH} ${HEIGHT + 20} Z`;
}
