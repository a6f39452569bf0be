import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { MatTooltip } from '@angular/material/tooltip';
import { RouterLink, RouterLinkActive } from '@angular/router';
import { CurrentTeam } from '../session/current-team';
import { SessionStore } from '../session/session-store';
import { navigationGroups } from './navigation-groups';

/** The list of pages: icon and word, or icons alone with the word on hover (`isNarrow`). */
@Component({
  selector: 'app-side-navigation',
  imports: [MatIcon, MatTooltip, RouterLink, RouterLinkActive],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class.narrow]': 'isNarrow()' },
  templateUrl: './side-navigation.html',
  styleUrl: './side-navigation.scss',
})
export class SideNavigation {
  private readonly team = inject(CurrentTeam);
  private readonly session = inject(SessionStore);

  readonly isNarrow = input(false);
  readonly chosen = output();

  protected readonly groups = computed(() =>
    navigationGroups({
      teamKey: this.team.key(),
      may: (action) => this.team.may(action),
      isAdministrator: this.session.isAdministrator(),
      hasMailbox: this.session.mailbox(),
    }),
  );
}
