import { ChangeDetectionStrategy, Component, input, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { InstallationTeam, PersonView } from '@shared/contracts/teams';
import { TimeStamp } from '../ui/time-stamp';
import type { PersonChange } from './person-change';
import { PersonPanel } from './person-panel';

/** People with their teams; one at a time opens to be changed. */
@Component({
  selector: 'app-people-table',
  imports: [MatButton, MatIcon, PersonPanel, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './people-table.html',
  styles: `
    .table-frame {
      position: relative;
    }
    td {
      padding-block: 2px;
    }
    .act {
      text-align: end;
    }
    .open,
    .panel {
      background: var(--sl-surface-low);
    }
    @media (max-width: 719px) {
      .since,
      .email,
      .teams {
        display: none;
      }
    }
  `,
})
export class PeopleTable {
  readonly people = input.required<readonly PersonView[]>();
  readonly teams = input.required<readonly InstallationTeam[]>();
  readonly myId = input.required<number>();
  readonly changed = output<PersonChange>();

  protected readonly openId = signal<number | null>(null);

  protected toggle(id: number): void {
    this.openId.update((openId) => (openId === id ? null : id));
  }
}
