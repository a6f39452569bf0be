import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { AuditPage } from '@shared/contracts/audit';
import { TimeStamp } from '../../ui/time-stamp';
import { ProductInView } from '../product-in-view';
import { referenceChoices } from './reference-choices';

/** As many lines as the audit log gives at once. */
const LINES = 500;

/** Every choice of the reference that the newest lines of the audit log hold; leads may read it. */
@Component({
  selector: 'app-reference-history',
  imports: [TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (choices(); as choices) {
      @if (choices.length > 0) {
        <h3>Choices so far</h3>
        <ul>
          @for (choice of choices; track choice.id) {
            <li>
              <span class="muted small"><app-time [at]="choice.at" detail="day" />, {{ choice.actor }}</span>
              <span
                ><strong>{{ choice.what }}</strong
                >: {{ choice.reason }}</span
              >
            </li>
          }
        </ul>
      }
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 6px;
    }
    ul {
      display: grid;
      gap: 8px;
      margin: 0;
      padding: 0;
      list-style: none;
    }
    li {
      display: grid;
      padding-inline-start: 10px;
      border-inline-start: 2px solid var(--sl-hairline);
    }
    strong {
      font-weight: 500;
    }
  `,
})
export class ReferenceHistory {
  private readonly view = inject(ProductInView);

  /** When the present one was chosen: another choice brings another history. */
  readonly chosenAt = input.required<string>();

  private readonly answer = httpResource<AuditPage>(() => {
    this.chosenAt();
    return { url: `/api/teams/${this.view.team()}/audit`, params: { limit: LINES } };
  });
  protected readonly choices = computed(() => {
    const builds = this.view.builds();
    return builds && this.answer.hasValue() ? referenceChoices(this.answer.value().entries, builds) : undefined;
  });
}
