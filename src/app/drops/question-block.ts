import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** The frame of one of the five questions: the question at the side, the evidence beside it. */
@Component({
  selector: 'app-question-block',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <section class="sheet" [attr.aria-label]="question()">
      <h2>{{ question() }}</h2>
      <div class="evidence"><ng-content /></div>
    </section>
  `,
  styles: `
    :host {
      display: block;
    }
    section {
      display: grid;
      grid-template-columns: 150px minmax(0, 1fr);
      gap: 8px 24px;
    }
    h2 {
      position: sticky;
      top: 64px;
      align-self: start;
    }
    .evidence {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 14px;
    }
    @media (max-width: 1099px) {
      section {
        grid-template-columns: minmax(0, 1fr);
      }
      h2 {
        position: static;
      }
    }
  `,
})
export class QuestionBlock {
  readonly question = input.required<string>();
}
