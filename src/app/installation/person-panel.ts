import { ChangeDetectionStrategy, Component, computed, input, linkedSignal, output } from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatSelectChange, MatSelectModule } from '@angular/material/select';
import { MatSlideToggle, MatSlideToggleChange } from '@angular/material/slide-toggle';
import { type Role, ROLES } from '@shared/access/roles';
import type { InstallationTeam, PersonView } from '@shared/contracts/teams';
import type { PersonChange } from './person-change';

/** Teams, roles and account of one person. */
@Component({
  selector: 'app-person-panel',
  imports: [MatButton, MatFormFieldModule, MatIcon, MatIconButton, MatSelectModule, MatSlideToggle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './person-panel.html',
  styleUrl: './person-panel.scss',
})
export class PersonPanel {
  readonly person = input.required<PersonView>();
  readonly teams = input.required<readonly InstallationTeam[]>();
  readonly isMe = input.required<boolean>();
  readonly changed = output<PersonChange>();

  protected readonly roles = ROLES;
  protected readonly otherTeams = computed(() =>
    this.teams().filter(({ key }) => !this.person().memberships.some(({ team }) => team === key)),
  );
  /** What is about to be added; starts anew once it was. */
  protected readonly newTeam = linkedSignal(() => this.otherTeams()[0]?.key ?? '');
  protected readonly newRole = linkedSignal<PersonView, Role>({ source: this.person, computation: () => 'viewer' });

  /** The controls keep showing what the server has; its answer moves them. */
  protected chooseRole(team: string, current: Role, { source, value }: MatSelectChange<Role>): void {
    source.value = current;
    this.changed.emit({ person: this.person(), kind: 'role', team, role: value });
  }

  protected add(): void {
    this.changed.emit({ person: this.person(), kind: 'role', team: this.newTeam(), role: this.newRole() });
  }

  protected leave(team: string, teamName: string): void {
    this.changed.emit({ person: this.person(), kind: 'leave', team, teamName });
  }

  protected switchAccount(what: 'isAdministrator' | 'isDisabled', { source, checked }: MatSlideToggleChange): void {
    source.checked = this.person()[what];
    this.changed.emit({ person: this.person(), kind: 'account', patch: { [what]: checked } });
  }
}
