import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { FULL_RANGE_HZ } from '../ui/chart/frequency-scale';
import type { OverlayScene } from './overlay-scene';
import { PICTURE, sheetPictureShape } from './sheet-picture-shape';

/** The overlay in black on white: limit heavy, build solid, reference thin and dashed, background dotted. */
@Component({
  selector: 'app-sheet-picture',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let shape = this.shape();
    <svg [attr.viewBox]="viewBox" role="img" aria-label="Build over reference under the limit">
      <clipPath id="sheet-plot">
        <rect [attr.x]="frame.left" [attr.y]="frame.top" [attr.width]="plotWidth" [attr.height]="plotHeight" />
      </clipPath>
      @for (tick of shape.ticks; track tick.x) {
        <line class="grid" [attr.x1]="tick.x" [attr.x2]="tick.x" [attr.y1]="frame.top" [attr.y2]="plotBottom" />
        <text [attr.x]="tick.x" [attr.y]="plotBottom + 12" text-anchor="middle">{{ tick.label }}</text>
      }
      @for (level of shape.levels; track level.y) {
        <line class="grid" [attr.x1]="frame.left" [attr.x2]="plotRight" [attr.y1]="level.y" [attr.y2]="level.y" />
        <text [attr.x]="frame.left - 4" [attr.y]="level.y + 3" text-anchor="end">{{ level.label }}</text>
      }
      <g clip-path="url(#sheet-plot)">
        @if (shape.worstX !== null) {
          <line
            class="worst"
            [attr.x1]="shape.worstX"
            [attr.x2]="shape.worstX"
            [attr.y1]="frame.top"
            [attr.y2]="plotBottom"
          />
        }
        @for (trace of shape.traces; track trace.id) {
          <polyline [attr.class]="trace.role" [attr.points]="trace.points" />
        }
        @for (limit of shape.limits; track limit.name) {
          <polyline class="limit" [attr.points]="limit.points" />
        }
      </g>
    </svg>
    <p>
      Level in dBµV over frequency, {{ scene().series }}. Heavy line: {{ limitNames() }}. Solid: this build. Dashed: the
      reference. Dotted: background. Upright: the worst point.
    </p>
  `,
  styles: `
    svg {
      display: block;
      width: 100%;
      height: auto;
      border: 1px solid;
    }
    text {
      fill: currentcolor;
      font-size: 10px;
    }
    polyline,
    line {
      fill: none;
      stroke: currentcolor;
    }
    .grid {
      opacity: 0.2;
      stroke-width: 0.5;
    }
    .limit {
      stroke-width: 2.2;
    }
    .build {
      stroke-width: 1;
    }
    .reference {
      opacity: 0.75;
      stroke-dasharray: 3 1.5;
      stroke-width: 0.7;
    }
    .background {
      opacity: 0.6;
      stroke-dasharray: 0.8 1.6;
      stroke-width: 0.6;
    }
    .worst {
      stroke-dasharray: 6 2 1 2;
      stroke-width: 0.8;
    }
    p {
      font-size: 10px;
      line-height: 14px;
    }
  `,
})
export class SheetPicture {
  readonly scene = input.required<OverlayScene>();
  readonly worstHz = input.required<number | null>();

  protected readonly frame = PICTURE;
  protected readonly viewBox = `0 0 ${PICTURE.width} ${PICTURE.height}`;
  protected readonly plotRight = PICTURE.width - PICTURE.right;
  protected readonly plotBottom = PICTURE.height - PICTURE.bottom;
  protected readonly plotWidth = this.plotRight - PICTURE.left;
  protected readonly plotHeight = this.plotBottom - PICTURE.top;
  protected readonly shape = computed(() => sheetPictureShape(this.scene(), FULL_RANGE_HZ, this.worstHz()));
  protected readonly limitNames = computed(() =>
    this.scene()
      .limits.map(({ name }) => name)
      .join(', '),
  );
}
