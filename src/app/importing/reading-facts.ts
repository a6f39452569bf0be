import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { ReadingView } from '@shared/contracts/imports';
import { remarksOnSettings } from '@shared/traces/sweep-remarks';
import { formatFrequency } from '@shared/units/format-frequency';

const DELIMITER_WORDS: Record<string, string> = { ',': 'comma', ';': 'semicolon', '\t': 'tab' };

/** What was recognised in a file, what was concluded and why, and what is odd about it. */
@Component({
  selector: 'app-reading-facts',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <dl>
      @for (fact of facts(); track fact.name) {
        <div>
          <dt>{{ fact.name }}</dt>
          <dd class="number">{{ fact.text }}</dd>
        </div>
      }
    </dl>
    @if (reading().preamble.length > 0) {
      <details>
        <summary>{{ preambleWords() }}</summary>
        <table>
          @for (one of reading().preamble; track one.line) {
            <tr>
              <td class="number">{{ one.line }}</td>
              <th scope="row">{{ one.key }}</th>
              <td>{{ one.value }}</td>
            </tr>
          }
        </table>
      </details>
    }
    @for (one of reading().inferred; track one.what) {
      <p>
        <mat-icon class="inline-icon" svgIcon="info" /><strong>{{ one.what }} {{ one.value }}</strong
        >: {{ one.why }}
      </p>
    }
    @for (remark of remarks(); track remark.code) {
      <p><mat-icon class="inline-icon" svgIcon="note" />{{ remark.text }}</p>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 6px;
      font-size: 13px;
    }
    dl {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 24px;
      margin: 0;
    }
    dt {
      color: var(--sl-ink-muted);
      font-size: 12px;
      line-height: 16px;
    }
    dd {
      margin: 0;
    }
    summary {
      width: fit-content;
      color: var(--sl-ink-muted);
      cursor: pointer;
    }
    table {
      margin-block-start: 4px;
      font-size: 12px;
    }
    table td,
    table th {
      padding: 0 12px 2px 0;
      font-weight: 400;
      text-align: start;
      vertical-align: top;
      overflow-wrap: anywhere;
    }
    table td.number {
      color: var(--sl-ink-muted);
    }
    mat-icon {
      margin-inline-end: 4px;
      color: var(--sl-ink-muted);
    }
  `,
})
export class ReadingFacts {
  readonly reading = input.required<ReadingView>();
  /** Resolution bandwidth of the tags, for a file that states none. */
  readonly taggedRbwHz = input<number>();

  /** A bandwidth that the tags add is reckoned with as it will be on saving. */
  protected readonly remarks = computed(() => {
    const rbwHz = this.taggedRbwHz();
    const reading = this.reading();
    return reading.rbwHz === null && rbwHz !== undefined
      ? remarksOnSettings({ rbwHz, grid: reading })
      : reading.remarks;
  });

  protected readonly preambleWords = computed(() => {
    const { length } = this.reading().preamble;
    return length === 1 ? 'One line above the table' : `${length} lines above the table`;
  });

  protected readonly facts = computed(() => {
    const { pointCount, startHz, stopHz, medianStepHz, frequencyUnit, traces, ...file } = this.reading();
    const marks = file.decimalMark === ',' ? 'decimal comma' : 'decimal point';
    return [
      { name: 'Points', text: pointCount.toLocaleString('en') },
      { name: 'Range', text: `${formatFrequency(startHz)} to ${formatFrequency(stopHz)}` },
      { name: 'Step', text: formatFrequency(medianStepHz) },
      { name: 'Units', text: `${frequencyUnit}, ${levelUnits(traces)}` },
      { name: 'RBW', text: file.rbwHz === null ? 'not stated' : formatFrequency(file.rbwHz) },
      { name: 'Attenuation', text: file.attenuationDb === null ? 'not stated' : `${file.attenuationDb} dB` },
      { name: 'Written with', text: `${DELIMITER_WORDS[file.delimiter] ?? file.delimiter}, ${marks}` },
    ];
  });
}

function levelUnits(traces: ReadingView['traces']): string {
  return [...new Set(traces.map(({ levelUnit }) => levelUnit.replace('u', 'µ')))].join(', ');
}
