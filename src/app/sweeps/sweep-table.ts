import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatCheckbox } from '@angular/material/checkbox';
import { MatIcon } from '@angular/material/icon';
import { MatTooltip } from '@angular/material/tooltip';
import { RouterLink } from '@angular/router';
import type { SweepView } from '@shared/contracts/sweeps';
import { CurrentTeam } from '../session/current-team';
import { FrequencyPipe } from '../ui/frequency';
import { KIND_WORDS } from '../ui/kind-words';
import { MarginValue } from '../ui/margin-value';
import { TimeStamp } from '../ui/time-stamp';

/** Sweeps, newest import first; ticked ones can be laid over each other. */
@Component({
  selector: 'app-sweep-table',
  imports: [FrequencyPipe, MarginValue, MatCheckbox, MatIcon, MatTooltip, RouterLink, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sweep-table.html',
  styles: `
    td.tick,
    th.tick {
      width: 40px;
      padding: 0 0 0 4px;
    }
    .remarks {
      display: inline-flex;
      gap: 2px;
      align-items: center;
      color: var(--sl-ink-muted);
    }
    .role {
      color: var(--sl-ink-muted);
    }
  `,
})
export class SweepTable {
  protected readonly current = inject(CurrentTeam);

  readonly team = input.required<string>();
  readonly sweeps = input.required<readonly SweepView[]>();
  readonly ticked = input.required<ReadonlySet<number>>();
  /** A list of one product need not name it in every row. */
  readonly hasProduct = input(true);
  readonly toggled = output<SweepView>();
  readonly allToggled = output<boolean>();

  protected readonly kindWords = KIND_WORDS;
  protected readonly tickedHere = computed(() => this.sweeps().filter(({ id }) => this.ticked().has(id)).length);

  protected remarksOf({ remarks }: SweepView): string {
    return remarks.map(({ text }) => text).join('\n');
  }
}
