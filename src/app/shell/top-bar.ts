import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { RouterLink } from '@angular/router';
import { BrandMark } from '../ui/brand-mark';
import { AccountMenu } from './account-menu';
import { TeamSwitcher } from './team-switcher';
import { ThemeSwitch } from './theme-switch';

@Component({
  selector: 'app-top-bar',
  imports: [AccountMenu, BrandMark, MatIcon, MatIconButton, RouterLink, TeamSwitcher, ThemeSwitch],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'banner' },
  template: `
    <button
      mat-icon-button
      type="button"
      [attr.aria-label]="isOpen() ? 'Fold the navigation' : 'Unfold the navigation'"
      [attr.aria-expanded]="isOpen()"
      (click)="menuToggled.emit()"
    >
      <mat-icon svgIcon="menu" />
    </button>
    <a class="home" routerLink="/" aria-label="Strandline, overview"><app-brand-mark /></a>
    <app-team-switcher />
    <span class="gap"></span>
    <app-theme-switch />
    <app-account-menu />
  `,
  styles: `
    :host {
      display: flex;
      gap: 4px;
      align-items: center;
      padding: 0 8px;
      border-bottom: 1px solid var(--sl-hairline);
      background: var(--sl-surface);
    }
    .home {
      display: flex;
      margin-inline-end: 12px;
      text-decoration: none;
    }
    app-team-switcher {
      display: flex;
      min-width: 0;
    }
    .gap {
      flex: 1;
    }
    @media (max-width: 479px) {
      .home {
        width: 28px;
        margin-inline-end: 0;
        overflow: hidden;
      }
    }
  `,
})
export class TopBar {
  readonly isOpen = input(false);
  readonly menuToggled = output();
}
