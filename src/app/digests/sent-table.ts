import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { DigestView } from '@shared/contracts/digests';
import { TimeStamp } from '../ui/time-stamp';
import { periodWords } from './digest-words';

/** Digests written so far and how they were delivered. */
@Component({
  selector: 'app-sent-table',
  imports: [TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (sent().length === 0) {
      <p class="muted">None yet.</p>
    } @else {
      <div class="table-frame" tabindex="0" role="group" aria-label="Digests sent">
        <table class="dense-table">
          <caption class="visually-hidden">
            Digests sent so far
          </caption>
          <thead>
            <tr>
              <th scope="col">Week</th>
              <th scope="col">Subject</th>
              <th scope="col">Written</th>
              <th scope="col" class="number">Delivered</th>
              <th scope="col" class="number">Waiting</th>
              <th scope="col" class="number">Failed</th>
            </tr>
          </thead>
          <tbody>
            @for (digest of sent(); track digest.id) {
              <tr>
                <td>{{ periodWords(digest.period) }}</td>
                <td class="wrap">{{ digest.subject }}</td>
                <td><app-time [at]="digest.createdAt" /></td>
                <td class="number">{{ digest.delivered }}</td>
                <td class="number">{{ digest.waiting }}</td>
                <td class="number" [class.failed]="digest.failed > 0">{{ digest.failed }}</td>
              </tr>
            }
          </tbody>
        </table>
      </div>
    }
  `,
  styles: `
    .table-frame {
      position: relative;
    }
    .failed {
      color: var(--sl-lost);
      font-weight: 500;
    }
  `,
})
export class SentTable {
  readonly sent = input.required<DigestView['sent']>();

  protected readonly periodWords = periodWords;
}
