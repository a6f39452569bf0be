import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { Fact } from './sweep-facts';

/** Names and what they are, in two columns. */
@Component({
  selector: 'app-fact-list',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <dl>
      @for (fact of facts(); track fact.name) {
        <dt>{{ fact.name }}</dt>
        <dd class="number">{{ fact.text }}</dd>
      }
    </dl>
  `,
  styles: `
    dl {
      display: grid;
      grid-template-columns: minmax(110px, auto) 1fr;
      gap: 4px 16px;
      margin: 0;
      font-size: 13px;
      line-height: 18px;
    }
    dt {
      color: var(--sl-ink-muted);
    }
    dd {
      margin: 0;
      overflow-wrap: anywhere;
    }
  `,
})
export class FactList {
  readonly facts = input.required<readonly Fact[]>();
}
