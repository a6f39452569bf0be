import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatTabsModule } from '@angular/material/tabs';
import { RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { PageHeader } from '../ui/page-header';

const TABS = [
  { path: 'teams', label: 'Teams' },
  { path: 'people', label: 'People' },
  { path: 'audit', label: 'Audit' },
] as const;

/** What administrators of the installation see: teams, people and the log of their changes. */
@Component({
  selector: 'app-installation-frame',
  imports: [MatTabsModule, PageHeader, RouterLink, RouterLinkActive, RouterOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="page">
      <app-page-header
        title="Installation"
        lead="Teams and people of this installation. Results belong to the teams."
      />
      <nav mat-tab-nav-bar [tabPanel]="panel" mat-stretch-tabs="false" aria-label="Installation">
        @for (tab of tabs; track tab.path) {
          <a mat-tab-link [routerLink]="tab.path" routerLinkActive #link="routerLinkActive" [active]="link.isActive">{{
            tab.label
          }}</a>
        }
      </nav>
      <mat-tab-nav-panel #panel><router-outlet /></mat-tab-nav-panel>
    </div>
  `,
})
export class InstallationFrame {
  protected readonly tabs = TABS;
}
