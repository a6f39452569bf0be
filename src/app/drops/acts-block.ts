import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import type { DropView } from '@shared/contracts/drops';
import { CurrentTeam } from '../session/current-team';
import { DropHistory } from './drop-history';
import { DropStateChip } from './drop-state-chip';
import { MoveForm } from './move-form';
import { NoteForm } from './note-form';
import { OwnerChoice } from './owner-choice';
import { QuestionBlock } from './question-block';
import { whyNoMoves } from './who-may-act';

/** Owner, state with the moves that are allowed, notes and history. */
@Component({
  selector: 'app-acts-block',
  imports: [DropHistory, DropStateChip, MoveForm, NoteForm, OwnerChoice, QuestionBlock],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-question-block question="Who acts?">
      <div class="sides">
        <div class="acts">
          <p>
            <strong>{{ drop().owner?.name ?? 'Nobody yet' }}</strong>
            <app-drop-state-chip [state]="drop().state" />
            @if (drop().fixedBy; as fixedBy) {
              <span class="muted">shown by {{ fixedBy.hardware }} / {{ fixedBy.firmware }}</span>
            }
          </p>
          @if (whyNot(); as words) {
            <p class="muted">{{ words }}</p>
          } @else {
            <app-owner-choice [drop]="drop()" (assigned)="changed.emit($event)" />
            <app-move-form [drop]="drop()" (moved)="changed.emit($event)" />
            <app-note-form [drop]="drop()" (added)="changed.emit($event)" />
          }
        </div>
        <app-drop-history [history]="drop().history" />
      </div>
    </app-question-block>
  `,
  styles: `
    .sides {
      display: grid;
      grid-template-columns: repeat(auto-fit, minmax(min(360px, 100%), 1fr));
      gap: 16px 40px;
    }
    .acts {
      display: grid;
      gap: 16px;
      align-content: start;
    }
    .acts > p {
      display: flex;
      flex-wrap: wrap;
      gap: 8px;
      align-items: center;
    }
  `,
})
export class ActsBlock {
  private readonly currentTeam = inject(CurrentTeam);

  readonly drop = input.required<DropView>();
  /** The drop as the server has it after an act. */
  readonly changed = output<DropView>();

  protected readonly whyNot = computed(() =>
    whyNoMoves(this.drop(), {
      team: this.currentTeam.key() ?? '',
      teamName: this.currentTeam.team()?.name ?? '',
      role: this.currentTeam.role(),
      mayTriage: this.currentTeam.may('drops.triage'),
    }),
  );
}
