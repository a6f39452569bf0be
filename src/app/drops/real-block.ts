import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { MatIcon } from '@angular/material/icon';
import type { DropView } from '@shared/contracts/drops';
import { formatDecibels, formatSignedDecibels } from '@shared/units/format-decibels';
import { DecibelsPipe } from '../ui/decibels';
import { leadWitness, seriesName } from './lead-witness';
import { ownerQuery } from './owner-query';
import { QuestionBlock } from './question-block';
import { SetUpTable } from './set-up-table';
import { WitnessTable } from './witness-table';

/** The figures of the verdict, what both sides were measured with, and whatever speaks against it. */
@Component({
  selector: 'app-real-block',
  imports: [DecibelsPipe, MatIcon, QuestionBlock, RouterLink, SetUpTable, WitnessTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './real-block.html',
  styleUrl: './real-block.scss',
})
export class RealBlock {
  readonly drop = input.required<DropView>();
  readonly teamKey = input.required<string>();

  protected readonly owner = computed(() => ownerQuery(this.drop(), this.teamKey()));
  protected readonly lead = computed(() => leadWitness(this.drop()).judgement);
  protected readonly againstPrevious = computed(() => {
    const { line, detector, previousDifferenceDb } = this.lead();
    const series = `on ${line} ${detector}`;
    return previousDifferenceDb === null
      ? `, not measured ${series}.`
      : `, ${formatSignedDecibels(previousDifferenceDb)} against it ${series}.`;
  });
  /** Every source of spread once, with the series it stands for. */
  protected readonly spreads = computed(() => {
    const series = new Map<string, string[]>();
    for (const witness of this.drop().evidence.witnesses) {
      const { spread } = witness.judgement;
      const words = spread === null ? 'Not known' : `${formatDecibels(spread.sdDb)} ${spread.text}`;
      series.set(words, [...(series.get(words) ?? []), seriesName(witness)]);
    }
    return [...series].map(([words, names]) => (series.size === 1 ? `${words}.` : `${names.join(', ')}: ${words}.`));
  });
}
