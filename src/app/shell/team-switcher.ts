import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatMenuModule } from '@angular/material/menu';
import { Router } from '@angular/router';
import { CurrentTeam } from '../session/current-team';
import { SessionStore } from '../session/session-store';

@Component({
  selector: 'app-team-switcher',
  imports: [MatButton, MatIcon, MatMenuModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (current.team(); as team) {
      <button mat-button type="button" [matMenuTriggerFor]="menu" [attr.aria-label]="'Team: ' + team.name">
        <span class="name">{{ team.name }}</span>
        <mat-icon iconPositionEnd svgIcon="chevronDown" />
      </button>
      <mat-menu #menu="matMenu">
        @for (other of session.teams(); track other.key) {
          <button
            mat-menu-item
            type="button"
            role="menuitemradio"
            [attr.aria-checked]="other.key === team.key"
            (click)="switchTo(other.key)"
          >
            <mat-icon [svgIcon]="other.key === team.key ? 'check' : 'team'" />
            <span>{{ other.name }}</span> <span class="muted">{{ other.role }}</span>
          </button>
        }
      </mat-menu>
    }
  `,
  styles: `
    button.mat-mdc-button {
      max-width: 100%;
      color: var(--sl-ink);
    }
    .name {
      display: inline-block;
      max-width: 32ch;
      overflow: hidden;
      text-overflow: ellipsis;
      vertical-align: bottom;
    }
    @media (max-width: 479px) {
      .name {
        max-width: 15ch;
      }
    }
  `,
})
export class TeamSwitcher {
  private readonly router = inject(Router);
  protected readonly current = inject(CurrentTeam);
  protected readonly session = inject(SessionStore);

  /** Stays on the same list where there is one, so that drops of one team lead to drops of the other. */
  protected switchTo(key: string): void {
    const section = /^\/t\/[^/]+\/([^/?#]+)/.exec(this.router.url)?.[1];
    const stay = section !== undefined && section !== 'products';
    void this.router.navigate(['/t', key, stay ? section : 'overview']);
  }
}
