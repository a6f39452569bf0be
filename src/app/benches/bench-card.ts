import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { RouterLink } from '@angular/router';
import type { BenchView } from '@shared/contracts/benches';
import { formatDecibels } from '@shared/units/format-decibels';
import { TimeStamp } from '../ui/time-stamp';

/** A bench: what stands on it, how much it was used, and how well its runs repeat. */
@Component({
  selector: 'app-bench-card',
  imports: [MatButton, MatIcon, RouterLink, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class.archived]': 'bench().isArchived' },
  template: `
    @let bench = this.bench();
    <div class="head">
      <h2>{{ bench.name }}</h2>
      <code class="muted">{{ bench.key }}</code>
      @if (bench.isArchived) {
        <span class="mark">archived, takes no sweeps</span>
      }
      <span class="acts">
        @if (mayEdit()) {
          @if (!bench.isArchived) {
            <button mat-button type="button" (click)="edited.emit()"><mat-icon svgIcon="edit" />Edit</button>
          }
          <button mat-button type="button" [disabled]="isSaving()" (click)="archived.emit(!bench.isArchived)">
            <mat-icon [svgIcon]="bench.isArchived ? 'undo' : 'tray'" />{{
              bench.isArchived ? 'Take back into use' : 'Archive'
            }}
          </button>
        }
      </span>
    </div>
    <dl>
      <dt>Place</dt>
      <dd>{{ bench.location || 'not stated' }}</dd>
      <dt>LISN</dt>
      <dd>{{ bench.lisn || 'not stated' }}</dd>
      <dt>Receiver</dt>
      <dd>{{ bench.receiver || 'not stated' }}</dd>
      @if (bench.notes) {
        <dt>Notes</dt>
        <dd class="notes">{{ bench.notes }}</dd>
      }
      <dt>Repeat spread</dt>
      <dd>
        <span class="number">{{ spread() }}</span>
        <span class="muted">, {{ bench.spread.source }}</span>
      </dd>
      <dt>Used</dt>
      <dd>
        @if (bench.sweepCount > 0) {
          <a [routerLink]="['/t', team(), 'sweeps']" [queryParams]="{ bench: bench.key }">{{ uses() }}</a>
          @if (bench.lastSweepAt; as at) {
            (last <app-time [at]="at" detail="day" />)
          }
        } @else {
          no sweep yet
        }
      </dd>
    </dl>
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
    }
    .head {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 12px;
      align-items: center;
    }
    .acts {
      display: flex;
      flex-wrap: wrap;
      margin-inline-start: auto;
    }
    .mark {
      padding: 0 6px;
      border: 1px dashed var(--sl-outline);
      border-radius: 4px;
      color: var(--sl-ink-muted);
      font-size: 12px;
    }
    dl {
      display: grid;
      grid-template-columns: 110px minmax(0, 1fr);
      gap: 4px 16px;
      margin: 0;
      font-size: 13px;
      line-height: 18px;
    }
    dt {
      color: var(--sl-ink-muted);
    }
    dd {
      margin: 0;
      overflow-wrap: anywhere;
    }
    .notes {
      white-space: pre-line;
    }
    :host(.archived) h2 {
      color: var(--sl-ink-muted);
    }
  `,
})
export class BenchCard {
  readonly team = input.required<string>();
  readonly bench = input.required<BenchView>();
  readonly mayEdit = input.required<boolean>();
  readonly isSaving = input.required<boolean>();
  readonly edited = output();
  readonly archived = output<boolean>();

  protected readonly uses = computed(() => {
    const { sweepCount } = this.bench();
    return sweepCount === 1 ? 'one sweep' : `${sweepCount.toLocaleString('en')} sweeps`;
  });
  protected readonly spread = computed(() => {
    const { sdDb, degreesOfFreedom } = this.bench().spread;
    return `${formatDecibels(sdDb)} standard deviation of runs, ${Math.round(degreesOfFreedom)} degrees of freedom`;
  });
}
