import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { DigestView } from '@shared/contracts/digests';
import { TimeStamp } from '../ui/time-stamp';

type Recipient = DigestView['recipients'][number];

/** Who gets the digest, members and others; who unsubscribed stays listed, so that nobody is added against their will. */
@Component({
  selector: 'app-recipient-table',
  imports: [MatIcon, MatIconButton, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame" tabindex="0" role="group" aria-label="Who gets the digest">
      <table class="dense-table">
        <caption class="visually-hidden">
          Recipients of the digest
        </caption>
        <thead>
          <tr>
            <th scope="col">Name</th>
            <th scope="col">E-mail</th>
            <th scope="col">Who</th>
            <th scope="col">Gets it</th>
            @if (mayManage()) {
              <th scope="col"><span class="visually-hidden">Remove</span></th>
            }
          </tr>
        </thead>
        <tbody>
          @for (recipient of recipients(); track recipient.id) {
            <tr [class.muted]="recipient.unsubscribedAt !== null">
              <td>{{ recipient.name }}</td>
              <td>{{ recipient.email }}</td>
              <td>{{ recipient.isMember ? 'member' : 'from outside' }}</td>
              <td>
                @if (recipient.unsubscribedAt; as at) {
                  no, unsubscribed <app-time [at]="at" detail="day" />
                } @else {
                  yes
                }
              </td>
              @if (mayManage()) {
                <td class="act">
                  <button
                    mat-icon-button
                    type="button"
                    [attr.aria-label]="'Stop the digest for ' + recipient.email"
                    (click)="removed.emit(recipient)"
                  >
                    <mat-icon svgIcon="delete" />
                  </button>
                </td>
              }
            </tr>
          } @empty {
            <tr>
              <td [attr.colspan]="mayManage() ? 5 : 4">Nobody gets the digest yet.</td>
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
    .act {
      padding-block: 2px;
      text-align: end;
    }
  `,
})
export class RecipientTable {
  readonly recipients = input.required<readonly Recipient[]>();
  readonly mayManage = input.required<boolean>();
  readonly removed = output<Recipient>();
}
