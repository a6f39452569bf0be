import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { EmptyState } from '../ui/empty-state';

@Component({
  selector: 'app-page-not-found',
  imports: [EmptyState, MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="page">
      <h1 class="visually-hidden">Page not found</h1>
      <app-empty-state
        icon="search"
        heading="There is no such page"
        text="It may have been removed, or it belongs to a team you are not in."
      >
        <a mat-flat-button routerLink="/">Go to the overview</a>
      </app-empty-state>
    </div>
  `,
})
export class PageNotFound {}
