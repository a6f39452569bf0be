import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { JobRunView } from '@shared/contracts/job-runs';
import { ProgressLine } from '../ui/progress-line';
import { TimeStamp } from '../ui/time-stamp';
import { askedBy, countWords, durationText, JOB_WORDS, STATUS_LOOKS } from './run-looks';

/** Runs, newest first, with progress, counts and errors. */
@Component({
  selector: 'app-run-table',
  imports: [MatIcon, ProgressLine, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './run-table.html',
  styleUrl: './run-table.scss',
})
export class RunTable {
  readonly runs = input.required<readonly JobRunView[]>();

  protected readonly rows = computed(() => {
    const now = Date.now();
    return this.runs().map((run) => ({
      run,
      job: JOB_WORDS[run.job],
      asked: askedBy(run),
      look: STATUS_LOOKS[run.status],
      doneFraction: run.total > 0 ? run.done / run.total : undefined,
      counts: countWords(run.counts),
      duration: durationText(run, now),
    }));
  });
}
