import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { formatTime, TimeDetail } from './format-time';
import { TEAM_TIME_ZONE } from './team-time-zone';

/** A time in the team's zone; on hover to the second, with the zone. */
@Component({
  selector: 'app-time',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<time class="number" [attr.datetime]="iso()" [title]="full()">{{ text() }}</time>`,
  styles: `
    time {
      white-space: nowrap;
    }
  `,
})
export class TimeStamp {
  private readonly timeZone = inject(TEAM_TIME_ZONE);

  /** ISO 8601 text or ms since 1970 UTC. */
  readonly at = input.required<string | number>();
  readonly detail = input<TimeDetail>('minute');

  protected readonly iso = computed(() => new Date(this.at()).toISOString());
  protected readonly text = computed(() => formatTime(this.at(), this.timeZone(), this.detail()));
  protected readonly full = computed(() => `${formatTime(this.at(), this.timeZone(), 'second')} ${this.timeZone()}`);
}
