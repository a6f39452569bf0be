import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { DropView } from '@shared/contracts/drops';
import { fiveAnswers } from './five-answers';

/** The five answers at a glance; each leads to its block. */
@Component({
  selector: 'app-answer-strip',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'navigation', 'aria-label': 'The five questions' },
  template: `
    @for (answer of answers(); track answer.id) {
      <a [routerLink]="[]" [fragment]="answer.id" queryParamsHandling="preserve">
        <span class="question">{{ answer.question }}</span>
        <strong>{{ answer.short }}</strong>
        <span class="more">{{ answer.more }}</span>
      </a>
    }
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: repeat(auto-fit, minmax(190px, 1fr));
      overflow: hidden;
      border: 1px solid var(--sl-hairline);
      border-radius: 8px;
      background: var(--sl-hairline);
      gap: 1px;
    }
    a {
      display: grid;
      gap: 2px;
      align-content: start;
      padding: 10px 14px 12px;
      background: var(--sl-surface);
      color: var(--sl-ink);
      text-decoration: none;
    }
    a:hover {
      background: var(--sl-surface-low);
    }
    a:focus-visible {
      outline-offset: -2px;
    }
    .question {
      color: var(--sl-accent);
      font-size: 12px;
      line-height: 16px;
    }
    strong {
      font-weight: 500;
      font-variant-numeric: tabular-nums;
    }
    .more {
      color: var(--sl-ink-muted);
      font-size: 12px;
      line-height: 16px;
    }
  `,
})
export class AnswerStrip {
  readonly drop = input.required<DropView>();

  protected readonly answers = computed(() => fiveAnswers(this.drop()));
}
