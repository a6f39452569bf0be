import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatIcon } from '@angular/material/icon';

/** What can hurt people or the receiver at a bench with a LISN; always in view where benches are. */
@Component({
  selector: 'app-bench-cautions',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'note', 'aria-labelledby': 'cautions-title' },
  template: `
    <mat-icon svgIcon="over" />
    <div>
      <h2 id="cautions-title">Before you switch on</h2>
      <ul>
        <li>
          <strong>Earth first.</strong> The filter capacitors of a LISN put hundreds of mA into protective earth. Bond
          case and ground plane to protective earth before mains is connected, and keep them bonded.
        </li>
        <li><strong>RCD.</strong> Outlets behind a residual-current device may trip.</li>
        <li><strong>Unused port.</strong> The measuring port that is not in use carries a 50 ohm termination.</li>
        <li>
          <strong>Receiver.</strong> Protect its input with a limiter or attenuation, and disconnect it before the
          product or the mains is switched.
        </li>
        <li><strong>People.</strong> Work by qualified persons, under the local rules.</li>
      </ul>
      <p class="small">
        Pre-compliance results, not a certificate. Check limits against your edition of the standard; local rules and
        the accredited laboratory decide.
      </p>
    </div>
  `,
  styles: `
    :host {
      display: flex;
      gap: 12px;
      padding: 14px 16px;
      border: 1px solid var(--sl-margin-text-tight);
      border-inline-start-width: 6px;
      border-radius: 8px;
      background: var(--sl-surface);
    }
    mat-icon {
      flex: none;
      color: var(--sl-margin-text-tight);
    }
    div {
      min-width: 0;
    }
    ul {
      display: grid;
      grid-template-columns: repeat(auto-fit, minmax(min(300px, 100%), 1fr));
      gap: 6px 24px;
      margin: 6px 0 8px;
      padding-inline-start: 16px;
    }
  `,
})
export class BenchCautions {}
