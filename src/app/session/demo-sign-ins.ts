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
          <button type="button" [title]="signIn.email" [disabled]="disabled()" (click)="chosen.emit(signIn)">
            <span class="name">{{ signIn.name }}</span>
            <span class="role">{{ signIn.role }}</span>
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
      margin: 0;
      padding: 0;
      border: 1px solid var(--sl-hairline);
      border-radius: 6px;
      list-style: none;
      overflow: hidden;
    }
    li:not(:last-child) {
      border-bottom: 1px solid var(--sl-hairline);
    }
    button {
      display: flex;
      gap: 12px;
      justify-content: space-between;
      width: 100%;
      padding: 5px 12px;
      border: 0;
      background: none;
      color: inherit;
      font: inherit;
      font-size: 13px;
      text-align: start;
      cursor: pointer;
    }
    button:hover:enabled {
      background: var(--sl-surface-high);
    }
    button:focus-visible {
      outline-offset: -2px;
    }
    .name {
      font-weight: 500;
    }
    .role {
      color: var(--sl-ink-muted);
      text-align: end;
    }
  `,
})
export class DemoSignIns {
  readonly signIns = input.required<readonly DemoSignIn[]>();
  readonly disabled = input(false);
  readonly chosen = output<DemoSignIn>();
}
