import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { MatIcon } from '@angular/material/icon';
import type { DropView } from '@shared/contracts/drops';
import { TimeStamp } from '../ui/time-stamp';
import { VerdictChip } from '../ui/verdict-chip';
import { DropStateChip } from './drop-state-chip';
import { ownerQuery } from './owner-query';
import { isOverNow, sightingWords } from './sighting-words';

/** What dropped, in one sentence, and which build, state and band it is about. */
@Component({
  selector: 'app-drop-head',
  imports: [DropStateChip, MatIcon, RouterLink, TimeStamp, VerdictChip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let drop = this.drop();
    <a class="back" [routerLink]="['/t', teamKey(), 'drops']">
      <mat-icon class="inline-icon" svgIcon="back" />All drops
    </a>
    <p class="about">
      <a [routerLink]="['/t', teamKey(), 'products', drop.product]" [queryParams]="owner()">{{ drop.productName }}</a>
      <span>build {{ drop.hardware }} / {{ drop.firmware }}</span>
      <span>{{ drop.operatingState }}</span>
      <span class="number">{{ drop.band }}</span>
    </p>
    <h1>{{ drop.sentence }}</h1>
    <div class="foot">
      <app-verdict-chip verdict="lost" [isOverLimit]="isOverNow()" />
      <app-drop-state-chip [state]="drop.state" />
      <span class="muted">
        raised <app-time [at]="drop.createdAt" />
        @if (elsewhere(); as words) {
          <span>, {{ words }}</span>
        }
      </span>
      <span class="actions"><ng-content /></span>
    </div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 6px;
    }
    .back {
      display: inline-flex;
      align-items: center;
      justify-self: start;
      margin-inline-start: -4px;
      font-size: 13px;
      text-decoration: none;
    }
    .about {
      display: flex;
      flex-wrap: wrap;
      gap: 0 8px;
      color: var(--sl-ink-muted);
      font-size: 13px;
    }
    .about > :not(:first-child)::before {
      content: '·';
      margin-inline-end: 8px;
    }
    h1 {
      max-width: 46em;
      text-wrap: pretty;
    }
    .foot {
      display: flex;
      flex-wrap: wrap;
      gap: 8px;
      align-items: center;
      margin-top: 4px;
      font-size: 13px;
    }
    .actions {
      display: flex;
      flex-wrap: wrap;
      gap: 8px;
      margin-inline-start: auto;
    }
    @media (max-width: 719px) {
      h1 {
        font-size: 18px;
        line-height: 25px;
      }
      .actions {
        width: 100%;
        margin-inline-start: 0;
      }
    }
  `,
})
export class DropHead {
  readonly drop = input.required<DropView>();
  readonly teamKey = input.required<string>();

  protected readonly owner = computed(() => ownerQuery(this.drop(), this.teamKey()));
  protected readonly isOverNow = computed(() => isOverNow(this.drop()));
  protected readonly elsewhere = computed(() => sightingWords(this.drop()));
}
