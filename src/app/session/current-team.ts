import { computed, effect, inject, Injectable } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NavigationEnd, Router } from '@angular/router';
import { type Action, leastRole } from '@shared/access/permissions';
import { isAtLeast } from '@shared/access/roles';
import { filter, map } from 'rxjs';
import { SessionStore } from './session-store';

const LAST_TEAM = 'strandline.team';

/** The team of the address (/t/:team/...), with the person's role in it. */
@Injectable({ providedIn: 'root' })
export class CurrentTeam {
  private readonly session = inject(SessionStore);
  private readonly router = inject(Router);

  private readonly address = toSignal(
    this.router.events.pipe(
      filter((event) => event instanceof NavigationEnd),
      map((event) => event.urlAfterRedirects),
    ),
    { initialValue: this.router.url },
  );

  /** Key of the team on screen; off team pages the one looked at last, so that navigation stays put. */
  readonly key = computed(() => teamOf(this.address()) ?? this.lastKey());
  readonly team = computed(() => {
    const key = this.key();
    return key === undefined ? undefined : this.session.team(key);
  });
  readonly role = computed(() => this.team()?.role);
  readonly timeZone = computed(() => this.team()?.timeZone ?? 'UTC');
  readonly targetMarginDb = computed(() => this.team()?.targetMarginDb ?? 6);

  constructor() {
    effect(() => {
      const key = teamOf(this.address());
      if (key !== undefined && this.session.team(key)) localStorage.setItem(LAST_TEAM, key);
    });
  }

  /** Whether the person's role here allows the action; read inside a template or computed it follows the team. */
  may(action: Action): boolean {
    const role = this.role();
    return role !== undefined && isAtLeast(role, leastRole(action));
  }

  private lastKey(): string | undefined {
    const teams = this.session.teams();
    const last = localStorage.getItem(LAST_TEAM);
    return (teams.find((team) => team.key === last) ?? teams[0])?.key;
  }
}

function teamOf(address: string): string | undefined {
  const match = /^\/t\/([^/?#]+)/.exec(address);
  return match?.[1] === undefined ? undefined : decodeURIComponent(match[1]);
}
