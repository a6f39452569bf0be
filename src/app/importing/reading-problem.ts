import { ChangeDetectionStrategy, Component, computed, input, resource } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { Problem } from '@shared/contracts/problem';
import { excerptAround, ExcerptLine, readingFault } from './reading-fault';

/** Why a file cannot be taken: where, what was found, what was expected and what to do, with the lines themselves. */
@Component({
  selector: 'app-reading-problem',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let fault = this.fault();
    @if (fault.happened) {
      <p class="happened"><mat-icon class="inline-icon" svgIcon="error" />{{ fault.happened }}</p>
    }
    <dl>
      @if (fault.place) {
        <dt>Where</dt>
        <dd>{{ fault.place }}</dd>
      }
      @if (fault.found) {
        <dt>Found</dt>
        <dd>{{ fault.found }}</dd>
        <dt>Expected</dt>
        <dd>{{ fault.expected }}</dd>
      }
      @if (fault.advice) {
        <dt>What to do</dt>
        <dd>{{ fault.advice }}</dd>
      }
    </dl>
    @if (excerpt(); as lines) {
      <pre
        tabindex="0"
        aria-label="The lines of the file"
      >@for (line of lines; track line.number) {<span [class.fault]="line.number === fault.line"><span class="number">{{ line.number }}</span>{{ line.text }}
</span>}</pre>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
      padding: 10px 12px;
      border-inline-start: 4px solid var(--sl-lost);
      border-radius: 6px;
      background: var(--sl-lost-ground);
      font-size: 13px;
    }
    .happened {
      font-weight: 500;
    }
    .happened mat-icon {
      margin-inline-end: 4px;
    }
    dl {
      display: grid;
      grid-template-columns: auto 1fr;
      gap: 2px 12px;
      margin: 0;
    }
    dt {
      color: var(--sl-ink-muted);
    }
    dd {
      margin: 0;
      overflow-wrap: anywhere;
    }
    pre {
      margin: 0;
      padding: 6px 0;
      overflow-x: auto;
      border-radius: 4px;
      background: var(--sl-surface);
      font:
        12px/18px 'Noto Sans Mono',
        monospace;
    }
    pre > span {
      display: block;
      width: max-content;
      min-width: 100%;
      padding-inline-end: 12px;
    }
    pre .number {
      display: inline-block;
      width: 6ch;
      margin-inline-end: 12px;
      color: var(--sl-ink-muted);
      text-align: end;
      user-select: none;
    }
    pre .fault {
      background: var(--sl-lost-ground);
      color: var(--sl-lost);
    }
  `,
})
export class ReadingProblem {
  readonly problem = input.required<Problem>();
  /** The file, where it is at hand. */
  readonly file = input<File>();

  protected readonly fault = computed(() => readingFault(this.problem()));
  private readonly lines = resource<ExcerptLine[] | null, { file?: File; line: number | null }>({
    params: () => ({ file: this.file(), line: this.fault().line }),
    loader: async ({ params: { file, line } }) =>
      file === undefined || line === null ? null : excerptAround(await file.text(), line),
  });
  protected readonly excerpt = computed(() => (this.lines.hasValue() ? this.lines.value() : null));
}
