import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { BrandMark } from '../ui/brand-mark';
import { HighWaterPicture } from './high-water-picture';

/** Frame of the pages before sign-in: the form on paper, on wide screens beside a drawing of what the product does. */
@Component({
  selector: 'app-auth-frame',
  imports: [BrandMark, HighWaterPicture],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <main>
      <div class="paper">
        <app-brand-mark />
        <h1>{{ title() }}</h1>
        @if (lead()) {
          <p class="muted">{{ lead() }}</p>
        }
        <ng-content />
      </div>
      <p class="caution small muted">
        Pre-compliance results. They indicate; only an accredited test shows. Check limits against your edition.
      </p>
    </main>
    <app-high-water-picture />
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      min-height: 100%;
    }
    main {
      display: grid;
      grid-template-rows: 1fr auto;
      gap: 24px;
      padding: 32px 24px 16px;
      background: var(--sl-surface);
    }
    .paper {
      display: grid;
      gap: 12px;
      align-content: center;
      width: 100%;
      max-width: 380px;
      margin: 0 auto;
    }
    h1 {
      margin-top: 20px;
    }
    .caution {
      max-width: 380px;
      margin: 0 auto;
    }
    app-high-water-picture {
      display: none;
    }
    @media (min-width: 960px) {
      :host {
        grid-template-columns: minmax(440px, 2fr) 3fr;
      }
      app-high-water-picture {
        display: block;
      }
    }
    @media (max-width: 719px) {
      .paper {
        align-content: start;
      }
    }
  `,
})
export class AuthFrame {
  readonly title = input.required<string>();
  readonly lead = input('');
}
