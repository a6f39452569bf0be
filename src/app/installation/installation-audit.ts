import { ChangeDetectionStrategy, Component } from '@angular/core';
import { AuditLog } from '../ui/audit-log/audit-log';

/** Changes of people and accounts; changes within a team stand in that team's audit. */
@Component({
  selector: 'app-installation-audit',
  imports: [AuditLog],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <p class="muted">Changes of accounts, newest first. What was changed within a team stands in its own audit.</p>
    <app-audit-log path="/api/installation/audit" />
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
    }
  `,
})
export class InstallationAudit {}
