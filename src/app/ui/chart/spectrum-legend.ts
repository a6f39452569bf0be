import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import type { SpectrumTrace } from './spectrum-types';
import { TraceSwatch } from './trace-swatch';
import type { TraceLook } from './trace-look';

/** The traces by colour, dash and marker; each entry shows or hides its trace. */
@Component({
  selector: 'app-spectrum-legend',
  imports: [TraceSwatch],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (trace of traces(); track trace.id) {
      <button
        type="button"
        [attr.aria-pressed]="!hidden().has(trace.id)"
        [class.hidden]="hidden().has(trace.id)"
        [title]="hidden().has(trace.id) ? 'Show this trace' : 'Hide this trace'"
        (click)="toggled.emit(trace.id)"
      >
        <app-trace-swatch [look]="looks()[$index]" [isFill]="trace.role === 'background'" />{{ trace.label }}
      </button>
    }
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 2px 4px;
      min-width: 0;
    }
    button {
      display: inline-flex;
      gap: 6px;
      align-items: center;
      padding: 4px 6px;
      border: 0;
      border-radius: 4px;
      background: none;
      color: var(--sl-ink);
      font: inherit;
      font-size: 12px;
      line-height: 16px;
      text-align: start;
      cursor: pointer;
    }
    button:hover {
      background: var(--sl-surface-high);
    }
    .hidden {
      color: var(--sl-ink-muted);
      text-decoration: line-through;
    }
  `,
})
export class SpectrumLegend {
  readonly traces = input.required<readonly SpectrumTrace[]>();
  readonly looks = input.required<readonly TraceLook[]>();
  readonly hidden = input.required<ReadonlySet<string>>();
  readonly toggled = output<string>();
}
