import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** A thin line that moves while something of unknown length runs, or fills up to `doneFraction`. */
@Component({
  selector: 'app-progress-line',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    role: 'progressbar',
    '[attr.aria-label]': 'label()',
    '[attr.aria-valuemin]': '0',
    '[attr.aria-valuemax]': '1',
    '[attr.aria-valuenow]': 'doneFraction() ?? null',
  },
  template: `<span
    [class.moving]="doneFraction() === undefined"
    [style.width.%]="(doneFraction() ?? 0.35) * 100"
  ></span>`,
  styles: `
    :host {
      display: block;
      height: 3px;
      overflow: hidden;
      background: var(--sl-accent-ground);
    }
    span {
      display: block;
      height: 100%;
      background: var(--sl-accent);
      transition: width 200ms;
    }
    .moving {
      animation: cross 1.2s ease-in-out infinite;
    }
    @keyframes cross {
      from {
        transform: translateX(-100%);
      }
      to {
        transform: translateX(300%);
      }
    }
  `,
})
export class ProgressLine {
  readonly label = input('Working');
  /** 0 to 1; left out while the length is unknown. */
  readonly doneFraction = input<number>();
}
