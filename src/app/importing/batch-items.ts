import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { RouterLink } from '@angular/router';
import type { ImportBatchView } from '@shared/contracts/imports';
import { CurrentTeam } from '../session/current-team';
import type { IconName } from '../ui/icons';
import { KIND_WORDS } from '../ui/kind-words';
import { MarginValue } from '../ui/margin-value';

type Item = ImportBatchView['items'][number];

const LOOKS: Record<Item['status'], { word: string; icon: IconName }> = {
  waiting: { word: 'waiting', icon: 'clock' },
  imported: { word: 'imported', icon: 'check' },
  duplicate: { word: 'stored before', icon: 'copy' },
  refused: { word: 'refused', icon: 'error' },
};
const ROWS_AT_A_TIME = 200;

/** The traces of a batch, each with what became of it. */
@Component({
  selector: 'app-batch-items',
  imports: [MarginValue, MatButton, MatIcon, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame">
      <table class="dense-table">
        <caption class="visually-hidden">
          Traces of this import
        </caption>
        <thead>
          <tr>
            <th scope="col">Result</th>
            <th scope="col">Sweep</th>
            <th scope="col" class="number">Worst margin</th>
            <th scope="col">State</th>
            <th scope="col">Line</th>
            <th scope="col">Detector</th>
            <th scope="col">Role</th>
            <th scope="col">File</th>
            <th scope="col" class="number">Trace</th>
          </tr>
        </thead>
        <tbody>
          @for (item of rows(); track item.id) {
            <tr>
              <td [class]="item.status">
                <mat-icon class="inline-icon" [svgIcon]="looks[item.status].icon" /> {{ looks[item.status].word }}
              </td>
              <td>
                @if (item.sweepId !== null) {
                  <a [routerLink]="['/t', team(), 'sweeps', item.sweepId]">No. {{ item.sweepId }}</a>
                } @else if (item.status === 'imported' || item.status === 'duplicate') {
                  <span class="muted">removed since</span>
                }
              </td>
              <td class="number">
                @if (item.sweepId !== null) {
                  <app-margin-value
                    [marginDb]="item.worstMarginDb"
                    [targetMarginDb]="item.tags.kind === 'product' ? current.targetMarginDb() : 0"
                  />
                }
              </td>
              <td>{{ item.tags.state }}</td>
              <td>{{ item.tags.line }}</td>
              <td>{{ item.tags.detector }}</td>
              <td>{{ item.tags.kind ? kindWords[item.tags.kind] : '' }}</td>
              <td>{{ item.fileName }}</td>
              <td class="number">{{ item.tags.trace }}</td>
            </tr>
          }
        </tbody>
      </table>
    </div>
    @if (items().length > rows().length) {
      <button mat-button type="button" (click)="showMore()">Show more of {{ items().length }} traces</button>
    }
  `,
  styles: `
    .refused {
      color: var(--sl-lost);
      font-weight: 500;
    }
    .waiting,
    .duplicate {
      color: var(--sl-ink-muted);
    }
  `,
})
export class BatchItems {
  protected readonly current = inject(CurrentTeam);

  readonly team = input.required<string>();
  readonly items = input.required<readonly Item[]>();

  protected readonly looks = LOOKS;
  protected readonly kindWords = KIND_WORDS;
  private readonly most = signal(ROWS_AT_A_TIME);
  protected readonly rows = computed(() => this.items().slice(0, this.most()));

  protected showMore(): void {
    this.most.update((most) => most + ROWS_AT_A_TIME);
  }
}
