import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { MatDivider } from '@angular/material/divider';
import { MatIcon } from '@angular/material/icon';
import { MatMenuModule } from '@angular/material/menu';
import { MatTooltip } from '@angular/material/tooltip';
import { Router, RouterLink } from '@angular/router';
import { SessionStore } from '../session/session-store';

@Component({
  selector: 'app-account-menu',
  imports: [MatDivider, MatIcon, MatIconButton, MatMenuModule, MatTooltip, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <button
      mat-icon-button
      type="button"
      [matMenuTriggerFor]="menu"
      [attr.aria-label]="'Account of ' + session.person()?.name"
      [matTooltip]="session.person()?.name ?? ''"
    >
      <mat-icon svgIcon="account" />
    </button>
    <mat-menu #menu="matMenu">
      <div class="person">
        <strong>{{ session.person()?.name }}</strong>
        <span class="muted">{{ session.person()?.email }}</span>
      </div>
      <mat-divider />
      <a mat-menu-item routerLink="/account">
        <mat-icon svgIcon="settings" />
        <span>Your account</span>
      </a>
      <button mat-menu-item type="button" (click)="signOut()">
        <mat-icon svgIcon="signOut" />
        <span>Sign out</span>
      </button>
    </mat-menu>
  `,
  styles: `
    .person {
      display: grid;
      padding: 8px 12px;
      font-size: 13px;
      line-height: 18px;
    }
  `,
})
export class AccountMenu {
  private readonly router = inject(Router);
  protected readonly session = inject(SessionStore);

  protected signOut(): void {
    this.session.signOut().subscribe(() => void this.router.navigateByUrl('/sign-in'));
  }
}
