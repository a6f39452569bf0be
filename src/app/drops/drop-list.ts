import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { DropSummary } from '@shared/contracts/drops';
import { MarginValue } from '../ui/margin-value';
import { SignedDecibelsPipe } from '../ui/signed-decibels';
import { formatTime } from '../ui/format-time';
import { TEAM_TIME_ZONE } from '../ui/team-time-zone';
import { ageText } from './age-text';
import { DropStateChip } from './drop-state-chip';
import { marginScale } from './margin-scale';
import { MarginSlide } from './margin-slide';
import { marginBeforeDb, sightingWords } from './sighting-words';

/** Drops in rank order: the sentence first, then what is left and who acts. On a phone each drop is a sheet of its own. */
@Component({
  selector: 'app-drop-list',
  imports: [DropStateChip, MarginSlide, MarginValue, RouterLink, SignedDecibelsPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './drop-list.html',
  styleUrl: './drop-list.scss',
})
export class DropList {
  private readonly timeZone = inject(TEAM_TIME_ZONE);

  readonly drops = input.required<readonly DropSummary[]>();
  readonly teamKey = input.required<string>();
  /** Target margin by "team product", dB. */
  readonly targets = input.required<ReadonlyMap<string, number>>();
  readonly teamTargetDb = input.required<number>();

  protected readonly scale = computed(() =>
    marginScale(this.rows().flatMap(({ nowDb, beforeDb }) => [nowDb, beforeDb])),
  );
  protected readonly rows = computed(() => {
    const now = Date.now();
    return this.drops().map((drop) => ({
      drop,
      nowDb: drop.latest.marginDb,
      beforeDb: marginBeforeDb(drop.latest),
      elsewhere: sightingWords(drop),
      targetDb: this.targets().get(`${drop.team} ${drop.product}`) ?? this.teamTargetDb(),
      seenOn: drop.witnesses.map(({ line, detector }) => `${line} ${detector}`).join(', '),
      age: ageText(drop.createdAt, now),
      raisedAt: `Raised ${formatTime(drop.createdAt, this.timeZone())}`,
    }));
  });
}
