import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { CurrentTeam } from '../session/current-team';
import { AuditLog } from '../ui/audit-log/audit-log';
import { EmptyState } from '../ui/empty-state';
import { PageHeader } from '../ui/page-header';
import { pathOf } from './team-access';

/** Who changed what in the team, for its leads. */
@Component({
  selector: 'app-audit-page',
  imports: [AuditLog, EmptyState, PageHeader],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="page">
      <app-page-header title="Audit" lead="Every change of a setting, a role, a reference or a drop, newest first." />
      @if (mayRead()) {
        <app-audit-log [path]="path()" />
      } @else {
        <app-empty-state
          icon="audit"
          heading="The audit log is for leads"
          text="Ask a lead of the team to look something up."
        />
      }
    </div>
  `,
})
export class AuditPage {
  private readonly currentTeam = inject(CurrentTeam);

  readonly team = input.required<string>();

  protected readonly path = computed(() => `${pathOf(this.team())}/audit`);
  protected readonly mayRead = computed(() => this.currentTeam.may('audit.read'));
}
