import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import type { SessionView } from '@shared/contracts/session';

type DemoSignIn = SessionView['demoSignIns'][number];

/** The demo's people by role; one click signs in as them. Never rendered outside the demo. */
@Component({
  selector: 'app-demo-sign-ins',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2>Look around the demo as</h2>
    <ul>
      @for (signIn of signIns(); track signIn.email) {
        <li>
          <button type="button" [disabled]="disabled()" (click)="chosen.emit(signIn)">
            <span class="name">{{ signIn.name }}</span>
            <span class="role">{{ signIn.role }}</span>
            <span class="email">{{ signIn.email }}</span>
          </button>
        </li>
      }
    </ul>
  `,
  styles: `
    :host {
      display: block;
      margin-top: 12px;
      padding-top: 16px;
      border-top: 1px solid var(--sl-hairline);
    }
    h2 {
      margin-bottom: 8px;
      color: var(--sl-ink-muted);
      font-size: 13px;
      line-height: 20px;
    }
    ul {
      display: grid;
      gap: 4px;
      margin: 0;
      padding: 0;
      list-style: none;
    }
    button {
      display: grid;
      grid-template-columns: 1fr auto;
      gap: 0 12px;
      width: 100%;
      padding: 6px 12px;
      border: 1px solid var(--sl-hairline);
      border-radius: 6px;
      background: none;
      color: inherit;
      font: inherit;
      font-size: 13px;
      text-align: start;
      cursor: pointer;
    }
    button:hover:enabled {
      border-color: var(--sl-accent);
      background: var(--sl-surface-low);
    }
    .name {
      font-weight: 500;
    }
    .role {
      color: var(--sl-accent);
    }
    .email {
      grid-column: 1 / -1;
      overflow: hidden;
      color: var(--sl-ink-muted);
      font-size: 12px;
      line-height: 16px;
      text-overflow: ellipsis;
    }
  `,
})
export class DemoSignIns {
  readonly signIns = input.required<readonly DemoSignIn[]>();
  readonly disabled = input(false);
  readonly chosen = output<DemoSignIn>();
}
