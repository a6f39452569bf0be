import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { VerdictsView } from '@shared/contracts/judging';
import { DecibelsPipe } from '../../ui/decibels';
import { FrequencyPipe } from '../../ui/frequency';
import { MarginValue } from '../../ui/margin-value';
import { SignedDecibelsPipe } from '../../ui/signed-decibels';
import { VerdictChip } from '../../ui/verdict-chip';
import { JudgementPanel } from './judgement-panel';
import { SPREAD_WORDS } from './spread-words';
import { verdictRows } from './verdict-rows';

/** Every band of every operating state: the verdict, the numbers it rests on, and on demand how it was judged. */
@Component({
  selector: 'app-verdict-table',
  imports: [
    DecibelsPipe,
    FrequencyPipe,
    JudgementPanel,
    MarginValue,
    MatButton,
    MatIcon,
    SignedDecibelsPipe,
    VerdictChip,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './verdict-table.html',
  styleUrl: './verdict-table.scss',
})
export class VerdictTable {
  readonly judged = input.required<VerdictsView>();

  private readonly openIds = signal<ReadonlySet<string>>(new Set());
  protected readonly spreadWords = SPREAD_WORDS;
  protected readonly rows = computed(() =>
    verdictRows(this.judged().verdicts).map((row, i, all) => ({
      ...row,
      isOpen: this.openIds().has(row.id),
      /** Rows of its state for the first row of one, else nothing. */
      isFirstOfState: all[i - 1]?.state !== row.state,
    })),
  );

  protected toggle(id: string): void {
    const open = new Set(this.openIds());
    if (!open.delete(id)) open.add(id);
    this.openIds.set(open);
  }
}
