import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { SessionStore } from '../session/session-store';
import { EmptyState } from '../ui/empty-state';

/** What a person without a team sees. */
@Component({
  selector: 'app-home-page',
  imports: [EmptyState, MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="page">
      <h1 class="visually-hidden">Welcome</h1>
      <app-empty-state
        icon="members"
        heading="You are in no team yet"
        text="A lead of a team can invite you by e-mail. Administrators can make a team and its first lead."
      >
        @if (session.isAdministrator()) {
          <a mat-flat-button routerLink="/installation/teams">Make a team</a>
        }
      </app-empty-state>
    </div>
  `,
})
export class HomePage {
  protected readonly session = inject(SessionStore);
}
