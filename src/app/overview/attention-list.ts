import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { MatIcon } from '@angular/material/icon';
import type { ProductSummary } from '@shared/contracts/products';
import { urgencyOf } from './attention';
import { attentionWords, needsAttention, overviewSentence } from './attention-words';
import { productLink } from './product-link';

const ICONS = { over: 'over', belowTarget: 'belowTarget', lost: 'lost', openQuestion: 'unmeasured', quiet: 'held' };

/** What a lead reads first: one sentence, then one line for every product that needs attention. */
@Component({
  selector: 'app-attention-list',
  imports: [MatIcon, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <p class="sentence">{{ sentence() }}</p>
    @if (items().length > 0) {
      <ul>
        @for (item of items(); track item.key) {
          <li [class]="item.urgency">
            <mat-icon [svgIcon]="item.icon" />
            <span>
              <a [routerLink]="item.link.path" [queryParams]="item.link.query">{{ item.name }}</a><span class="number"
                >: {{ item.words }}.</span
              >
            </span>
          </li>
        }
      </ul>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 6px;
      padding-inline-start: 16px;
      border-inline-start: 3px solid var(--sl-accent);
    }
    .sentence {
      font-size: 18px;
      line-height: 26px;
      text-wrap: balance;
    }
    ul {
      display: grid;
      gap: 4px;
      margin: 0;
      padding: 0;
      list-style: none;
    }
    li {
      display: flex;
      gap: 8px;
      align-items: start;
    }
    mat-icon {
      flex: none;
      width: 16px;
      height: 16px;
      margin-top: 2px;
    }
    a {
      font-weight: 500;
    }
    .over mat-icon,
    .lost mat-icon {
      color: var(--sl-margin-text-over);
    }
    .belowTarget mat-icon {
      color: var(--sl-margin-text-tight);
    }
  `,
})
export class AttentionList {
  /** The most urgent first. */
  readonly products = input.required<readonly ProductSummary[]>();
  readonly teamKey = input.required<string>();

  protected readonly sentence = computed(() => overviewSentence(this.products()));
  protected readonly items = computed(() =>
    this.products()
      .filter(needsAttention)
      .map((product) => ({
        key: `${product.team} ${product.key}`,
        name: product.name,
        words: attentionWords(product),
        urgency: urgencyOf(product),
        icon: ICONS[urgencyOf(product)],
        link: productLink(this.teamKey(), product),
      })),
  );
}
