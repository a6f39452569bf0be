import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { IconName } from './icons';

/** Nothing here yet: says so in one line, then what to do next; buttons go inside the tag. */
@Component({
  selector: 'app-empty-state',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <mat-icon [svgIcon]="icon()" />
    <h2>{{ heading() }}</h2>
    @if (text()) {
      <p class="muted">{{ text() }}</p>
    }
    <div class="actions"><ng-content /></div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
      justify-items: center;
      padding: 40px 16px;
      border: 1px dashed var(--sl-outline);
      border-radius: 8px;
      text-align: center;
    }
    mat-icon {
      width: 32px;
      height: 32px;
      color: var(--sl-ink-muted);
    }
    p {
      max-width: 56ch;
    }
    .actions {
      display: flex;
      flex-wrap: wrap;
      gap: 8px;
      justify-content: center;
      margin-top: 8px;
    }
    .actions:empty {
      display: none;
    }
  `,
})
export class EmptyState {
  readonly heading = input.required<string>();
  readonly text = input('');
  readonly icon = input<IconName>('info');
}
