import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { MatIcon } from '@angular/material/icon';

/** Title of a page, one line of what it is about, where it belongs, and the page's main buttons (as content). */
@Component({
  selector: 'app-page-header',
  imports: [MatIcon, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="words">
      @if (backLink(); as link) {
        <a class="back" [routerLink]="link"><mat-icon class="inline-icon" svgIcon="back" />{{ backText() }}</a>
      }
      <h1>{{ title() }}</h1>
      @if (lead()) {
        <p class="muted">{{ lead() }}</p>
      }
    </div>
    <div class="actions"><ng-content /></div>
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 8px 16px;
      align-items: end;
      justify-content: space-between;
    }
    .words {
      min-width: 0;
    }
    h1 {
      overflow-wrap: anywhere;
    }
    .back {
      display: inline-flex;
      align-items: center;
      margin-inline-start: -4px;
      font-size: 13px;
      text-decoration: none;
    }
    .back:hover {
      text-decoration: underline;
    }
    .actions {
      display: flex;
      flex-wrap: wrap;
      gap: 8px;
      align-items: center;
    }
    .actions:empty {
      display: none;
    }
  `,
})
export class PageHeader {
  readonly title = input.required<string>();
  readonly lead = input('');
  /** Router commands to the page above this one. */
  readonly backLink = input<string | readonly unknown[]>();
  readonly backText = input('Back');
}
