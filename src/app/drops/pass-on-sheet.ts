import { DOCUMENT } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { DropView } from '@shared/contracts/drops';
import { formatSignedDecibels } from '@shared/units/format-decibels';
import { DecibelsPipe } from '../ui/decibels';
import { FrequencyPipe } from '../ui/frequency';
import { TimeStamp } from '../ui/time-stamp';
import { fiveAnswers } from './five-answers';
import { formatChance } from './format-chance';
import { leadWitness, referenceName } from './lead-witness';
import { marginWords } from './margin-words';
import type { OverlayScene } from './overlay-scene';
import { SheetPicture } from './sheet-picture';
import { buildName } from './sighting-words';

/** Notes that still fit the page. */
const NOTES = 4;

/** The drop on one sheet of paper, to hand to whoever measures or decides next. */
@Component({
  selector: 'app-pass-on-sheet',
  imports: [DecibelsPipe, FrequencyPipe, SheetPicture, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './pass-on-sheet.html',
  styleUrl: './pass-on-sheet.scss',
})
export class PassOnSheet {
  private readonly location = inject(DOCUMENT).location;

  readonly drop = input.required<DropView>();
  readonly scene = input.required<OverlayScene | undefined>();

  protected readonly answers = computed(() => fiveAnswers(this.drop()));
  protected readonly reference = computed(() => referenceName(this.drop().evidence));
  protected readonly worstHz = computed(() => leadWitness(this.drop()).judgement.worst?.frequencyHz ?? null);
  protected readonly address = computed(() => {
    const { team, id } = this.drop();
    return `${this.location.origin}/t/${team}/drops/${id}`;
  });
  protected readonly witnesses = computed(() =>
    this.drop().evidence.witnesses.map(({ line, detector, judgement }) => ({
      series: `${line} ${detector}`,
      change: judgement.differenceDb === null ? '' : formatSignedDecibels(judgement.differenceDb),
      interval: judgement.interval?.map((endDb) => endDb.toFixed(1)).join(' to ') ?? '',
      chance: judgement.adjustedP === null ? '' : formatChance(judgement.adjustedP),
      spreadDb: judgement.spread?.sdDb,
      spreadSource: judgement.spread?.text ?? '',
      runs: `${judgement.buildRuns} / ${judgement.referenceRuns}`,
      worst: judgement.worst,
    })),
  );
  protected readonly differing = computed(() => this.drop().evidence.setUp.filter(({ isDifferent }) => isDifferent));
  protected readonly alike = computed(() =>
    this.drop()
      .evidence.setUp.filter(({ isDifferent, what }) => !isDifferent && what !== 'Taken')
      .map(({ what, build }) => `${what}: ${build}`)
      .join('; '),
  );
  protected readonly sightings = computed(() => {
    const { seenIn, noLongerSeenIn } = this.drop();
    const seen = seenIn.map((one) => `${buildName(one)} (${marginWords(one.marginDb)})`).join(', ');
    return `Seen in ${seen}${noLongerSeenIn === null ? '' : `; the margin is back in ${buildName(noLongerSeenIn)}`}.`;
  });
  protected readonly notes = computed(() =>
    this.drop()
      .history.filter(({ kind }) => kind === 'note' || kind === 'moved')
      .slice(-NOTES),
  );
}
