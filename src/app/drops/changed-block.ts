import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { DropView } from '@shared/contracts/drops';
import { SignedDecibelsPipe } from '../ui/signed-decibels';
import { changeSplit } from './change-split';
import { leadWitness, referenceName } from './lead-witness';
import { ownerQuery } from './owner-query';
import { QuestionBlock } from './question-block';

/** What the team declared to be different, and how the change of margin splits into level and limit. */
@Component({
  selector: 'app-changed-block',
  imports: [QuestionBlock, RouterLink, SignedDecibelsPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './changed-block.html',
  styles: `
    .split {
      display: grid;
      grid-template-columns: auto minmax(0, 1fr);
      gap: 2px 12px;
      margin: 0;
    }
    dt {
      font-variant-numeric: tabular-nums;
      text-align: end;
    }
    dd {
      margin: 0;
    }
    .sum {
      border-top: 1px solid var(--sl-ink);
      font-weight: 500;
    }
    .dense-table:not(.mat-mdc-table) tbody th {
      height: auto;
      font-size: 13px;
      font-weight: 400;
    }
    p {
      max-width: 76ch;
    }
    .table-frame {
      position: relative;
      max-width: 900px;
    }
    @media (max-width: 719px) {
      th,
      td.wrap {
        min-width: 80px;
        padding-inline: 8px;
        white-space: normal;
      }
    }
  `,
})
export class ChangedBlock {
  readonly drop = input.required<DropView>();
  readonly teamKey = input.required<string>();

  protected readonly owner = computed(() => ownerQuery(this.drop(), this.teamKey()));
  protected readonly reference = computed(() => referenceName(this.drop().evidence));
  protected readonly lead = computed(() => leadWitness(this.drop()).judgement);
  protected readonly split = computed(() => {
    const { move } = this.lead();
    return move === null ? [] : changeSplit(move);
  });
}
