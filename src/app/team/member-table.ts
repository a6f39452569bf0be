import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatMenuModule } from '@angular/material/menu';
import { MatTooltip } from '@angular/material/tooltip';
import { type Role, ROLES } from '@shared/access/roles';
import type { MemberView } from '@shared/contracts/teams';
import { TimeStamp } from '../ui/time-stamp';
import { ROLE_WORDS } from './role-words';

/** The people of the team; leads change roles and remove people. */
@Component({
  selector: 'app-member-table',
  imports: [MatButton, MatIcon, MatIconButton, MatMenuModule, MatTooltip, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame" tabindex="0" role="group" aria-label="Members">
      <table class="dense-table">
        <caption class="visually-hidden">
          Members
        </caption>
        <thead>
          <tr>
            <th scope="col">Name</th>
            <th scope="col" class="email">E-mail</th>
            <th scope="col">Role</th>
            <th scope="col" class="since">Since</th>
            @if (mayManage()) {
              <th scope="col"><span class="visually-hidden">Remove</span></th>
            }
          </tr>
        </thead>
        <tbody>
          @for (member of members(); track member.personId) {
            <tr>
              <td>
                {{ member.name }}
                @if (member.personId === myId()) {
                  <span class="muted">(you)</span>
                }
                <span class="below muted small">{{ member.email }}</span>
              </td>
              <td class="email muted">{{ member.email }}</td>
              <td class="role">
                @if (mayManage()) {
                  <button
                    mat-button
                    type="button"
                    [matMenuTriggerFor]="roles"
                    [attr.aria-label]="'Role of ' + member.name + ': ' + member.role"
                  >
                    {{ member.role }}<mat-icon iconPositionEnd svgIcon="chevronDown" />
                  </button>
                  <mat-menu #roles="matMenu">
                    @for (role of allRoles; track role) {
                      <button
                        mat-menu-item
                        type="button"
                        [disabled]="role === member.role"
                        (click)="roleChosen.emit({ member, role })"
                      >
                        <strong>{{ role }}</strong> <span class="muted small"> {{ words[role] }}</span>
                      </button>
                    }
                  </mat-menu>
                } @else {
                  {{ member.role }}
                }
              </td>
              <td class="since"><app-time [at]="member.since" detail="day" /></td>
              @if (mayManage()) {
                <td class="act">
                  <button
                    mat-icon-button
                    type="button"
                    [attr.aria-label]="'Remove ' + member.name"
                    [matTooltip]="member.personId === myId() ? 'Leave the team' : 'Remove from the team'"
                    (click)="removed.emit(member)"
                  >
                    <mat-icon svgIcon="delete" />
                  </button>
                </td>
              }
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
    .role,
    .act {
      padding-block: 2px;
    }
    .role button {
      margin-inline-start: -12px;
    }
    .act {
      text-align: end;
    }
    .below {
      display: none;
    }
    @media (max-width: 719px) {
      .since,
      .email {
        display: none;
      }
      .below {
        display: block;
        overflow-wrap: anywhere;
        white-space: normal;
      }
    }
  `,
})
export class MemberTable {
  readonly members = input.required<readonly MemberView[]>();
  readonly myId = input.required<number>();
  readonly mayManage = input.required<boolean>();
  readonly roleChosen = output<{ member: MemberView; role: Role }>();
  readonly removed = output<MemberView>();

  protected readonly allRoles = ROLES;
  protected readonly words = ROLE_WORDS;
}
