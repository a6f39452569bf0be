import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { PendingInvitation } from '@shared/contracts/teams';
import { TimeStamp } from '../ui/time-stamp';

/** Invitations nobody answered yet. */
@Component({
  selector: 'app-invitation-table',
  imports: [MatButton, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h3>Not answered yet</h3>
    <div class="table-frame">
      <table class="dense-table">
        <caption class="visually-hidden">
          Invitations not answered yet
        </caption>
        <thead>
          <tr>
            <th scope="col">E-mail</th>
            <th scope="col">Role</th>
            <th scope="col">Invited by</th>
            <th scope="col">Good until</th>
            <th scope="col"><span class="visually-hidden">Actions</span></th>
          </tr>
        </thead>
        <tbody>
          @for (row of rows(); track row.invitation.id) {
            @let invitation = row.invitation;
            <tr>
              <td>{{ invitation.email }}</td>
              <td>{{ invitation.role }}</td>
              <td>{{ invitation.invitedBy }}</td>
              <td>
                <app-time [at]="invitation.expiresAt" />
                @if (row.isExpired) {
                  <strong class="expired"> expired</strong>
                }
              </td>
              <td class="acts">
                <button mat-button type="button" (click)="resent.emit(invitation)">Send a new link</button>
                <button mat-button type="button" (click)="revoked.emit(invitation)">Take back</button>
              </td>
            </tr>
          }
        </tbody>
      </table>
    </div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 6px;
    }
    .table-frame {
      position: relative;
    }
    .acts {
      padding-block: 2px;
      text-align: end;
    }
    .expired {
      color: var(--sl-unsure);
    }
  `,
})
export class InvitationTable {
  readonly invitations = input.required<readonly PendingInvitation[]>();
  readonly resent = output<PendingInvitation>();
  readonly revoked = output<PendingInvitation>();

  protected readonly rows = computed(() => {
    const now = Date.now();
    return this.invitations().map((invitation) => ({ invitation, isExpired: Date.parse(invitation.expiresAt) < now }));
  });
}
