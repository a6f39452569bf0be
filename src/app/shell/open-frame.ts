import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { RouterLink, RouterOutlet } from '@angular/router';
import { SessionStore } from '../session/session-store';
import { BrandMark } from '../ui/brand-mark';
import { ThemeSwitch } from './theme-switch';

/** Frame of pages that need no sign-in, such as the demo's mailbox. */
@Component({
  selector: 'app-open-frame',
  imports: [BrandMark, RouterLink, RouterOutlet, ThemeSwitch],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <header>
      <a class="home" routerLink="/" aria-label="Strandline, start page"><app-brand-mark /></a>
      <nav aria-label="Main">
        <a routerLink="/">{{ session.person() ? 'Back to your team' : 'Sign in' }}</a>
      </nav>
      <app-theme-switch />
    </header>
    <main><router-outlet /></main>
  `,
  styles: `
    header {
      display: flex;
      gap: 16px;
      align-items: center;
      height: 52px;
      padding: 0 12px 0 20px;
      border-bottom: 1px solid var(--sl-hairline);
      background: var(--sl-surface);
    }
    .home {
      text-decoration: none;
    }
    nav {
      margin-inline-start: auto;
      font-size: 13px;
    }
  `,
})
export class OpenFrame {
  protected readonly session = inject(SessionStore);

  constructor() {
    this.session.load().subscribe();
  }
}
