import { ChangeDetectionStrategy, Component } from '@angular/core';
import { EmptyState } from '../ui/empty-state';

@Component({
  selector: 'app-no-message',
  imports: [EmptyState],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-empty-state icon="mail" heading="Choose a message to read it" />`,
})
export class NoMessage {}
