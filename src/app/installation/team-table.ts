import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { InstallationTeam } from '@shared/contracts/teams';

/** Teams with their size; archived ones stay listed and can be brought back. */
@Component({
  selector: 'app-team-table',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame">
      <table class="dense-table">
        <caption class="visually-hidden">
          Teams
        </caption>
        <thead>
          <tr>
            <th scope="col">Team</th>
            <th scope="col">Key</th>
            <th scope="col">Time zone</th>
            <th scope="col" class="number">Members</th>
            <th scope="col" class="number">Products</th>
            <th scope="col"><span class="visually-hidden">Actions</span></th>
          </tr>
        </thead>
        <tbody>
          @for (team of teams(); track team.key) {
            <tr [class.muted]="team.isArchived">
              <td>
                {{ team.name }}
                @if (team.isArchived) {
                  <span class="small">archived</span>
                }
              </td>
              <td>
                <code>{{ team.key }}</code>
              </td>
              <td>{{ team.timeZone }}</td>
              <td class="number">{{ team.memberCount }}</td>
              <td class="number">{{ team.productCount }}</td>
              <td class="acts">
                @if (team.isArchived) {
                  <button
                    mat-button
                    type="button"
                    [attr.aria-label]="'Bring back ' + team.name"
                    (click)="restored.emit(team)"
                  >
                    Bring back
                  </button>
                } @else {
                  <button
                    mat-button
                    type="button"
                    [attr.aria-label]="'Invite into ' + team.name"
                    (click)="invited.emit(team)"
                  >
                    Invite
                  </button>
                  <button
                    mat-button
                    type="button"
                    [attr.aria-label]="'Archive ' + team.name"
                    (click)="archived.emit(team)"
                  >
                    Archive
                  </button>
                }
              </td>
            </tr>
          }
        </tbody>
      </table>
    </div>
  `,
  styles: `
    .table-frame {
      position: relative;
    }
    .acts {
      padding-block: 2px;
      text-align: end;
    }
  `,
})
export class TeamTable {
  readonly teams = input.required<readonly InstallationTeam[]>();
  readonly invited = output<InstallationTeam>();
  readonly archived = output<InstallationTeam>();
  readonly restored = output<InstallationTeam>();
}
