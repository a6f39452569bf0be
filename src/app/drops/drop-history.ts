import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { DropView } from '@shared/contracts/drops';
import type { IconName } from '../ui/icons';
import { TimeStamp } from '../ui/time-stamp';

const ICONS: Record<DropView['history'][number]['kind'], IconName> = {
  raised: 'drop',
  moved: 'arrowRight',
  owner: 'account',
  note: 'note',
  evidence: 'refresh',
  withdrawn: 'undo',
};

/** What happened to the drop, the latest first. */
@Component({
  selector: 'app-drop-history',
  imports: [MatIcon, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h3>History</h3>
    <ol>
      @for (event of events(); track $index) {
        <li>
          <mat-icon [svgIcon]="icons[event.kind]" />
          <div>
            <p>{{ event.text }}</p>
            <p class="muted small">{{ event.actor }}, <app-time [at]="event.at" /></p>
          </div>
        </li>
      }
    </ol>
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
      align-content: start;
    }
    ol {
      display: grid;
      gap: 10px;
      margin: 0;
      padding: 0;
      list-style: none;
    }
    li {
      display: flex;
      gap: 10px;
    }
    mat-icon {
      flex: none;
      width: 18px;
      height: 18px;
      margin-top: 1px;
      color: var(--sl-ink-muted);
    }
    p {
      overflow-wrap: anywhere;
    }
  `,
})
export class DropHistory {
  readonly history = input.required<DropView['history']>();

  protected readonly icons = ICONS;
  protected readonly events = computed(() => [...this.history()].reverse());
}
