import { ChangeDetectionStrategy, Component } from '@angular/core';

/** The product's name with its mark: emissions under the line of their high-water mark. */
@Component({
  selector: 'app-brand-mark',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <svg viewBox="0 0 32 32" aria-hidden="true">
      <path class="line" d="M4 9h24" />
      <path d="M4 26c3.5 0 3-9 6-9s2.5 9 6 9 3-6 6-6 2.5 6 6 6" />
    </svg>
    <span>Strandline</span>
  `,
  styles: `
    :host {
      display: inline-flex;
      gap: 8px;
      align-items: center;
      color: var(--sl-ink);
      font-size: 18px;
      font-weight: 500;
      letter-spacing: 0.01em;
    }
    svg {
      width: 26px;
      height: 26px;
      fill: none;
      stroke: var(--sl-accent);
      stroke-linecap: round;
      stroke-width: 2.6;
    }
    .line {
      stroke-dasharray: 3.4 3.46;
    }
  `,
})
export class BrandMark {}
