import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { TokenView } from '@shared/contracts/teams';
import { TimeStamp } from '../ui/time-stamp';

/** The team's tokens with their last use; revoked ones stay, so that the log can be read. */
@Component({
  selector: 'app-token-table',
  imports: [MatButton, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame">
      <table class="dense-table">
        <caption class="visually-hidden">
          Tokens
        </caption>
        <thead>
          <tr>
            <th scope="col">Name</th>
            <th scope="col">Scopes</th>
            <th scope="col">Made by</th>
            <th scope="col">Made</th>
            <th scope="col">Last used</th>
            <th scope="col"><span class="visually-hidden">Revoke</span></th>
          </tr>
        </thead>
        <tbody>
          @for (token of tokens(); track token.id) {
            <tr [class.muted]="token.revokedAt !== null">
              <td>{{ token.name }}</td>
              <td>
                <code>{{ token.scopes.join(', ') }}</code>
              </td>
              <td>{{ token.createdBy }}</td>
              <td><app-time [at]="token.createdAt" detail="day" /></td>
              <td>
                @if (token.lastUsedAt; as lastUsedAt) {
                  <app-time [at]="lastUsedAt" />
                } @else {
                  <span class="muted">never</span>
                }
              </td>
              <td class="act">
                @if (token.revokedAt; as revokedAt) {
                  revoked <app-time [at]="revokedAt" detail="day" />
                } @else {
                  <button
                    mat-button
                    type="button"
                    [attr.aria-label]="'Revoke ' + token.name"
                    (click)="revoked.emit(token)"
                  >
                    Revoke
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
    .act {
      padding-block: 2px;
      text-align: end;
    }
  `,
})
export class TokenTable {
  readonly tokens = input.required<readonly TokenView[]>();
  readonly revoked = output<TokenView>();
}
