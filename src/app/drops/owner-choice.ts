import { ChangeDetectionStrategy, Component, computed, inject, input, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectChange, MatSelectModule } from '@angular/material/select';
import type { DropView } from '@shared/contracts/drops';
import type { Problem } from '@shared/contracts/problem';
import { SessionStore } from '../session/session-store';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { DropTriage } from './drop-triage';

/** Who owns the drop; whoever looks may take it with one click. */
@Component({
  selector: 'app-owner-choice',
  imports: [MatButton, MatFormFieldModule, MatSelectModule, ProblemBanner],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="row">
      <mat-form-field>
        <mat-label>Owner</mat-label>
        <mat-select [value]="drop().owner?.id ?? 0" [disabled]="busy()" (selectionChange)="choose($event)">
          <mat-option [value]="0">nobody</mat-option>
          @for (person of people(); track person.id) {
            <mat-option [value]="person.id">{{ person.name }}</mat-option>
          }
        </mat-select>
      </mat-form-field>
      @if (mayTake(); as me) {
        <button mat-flat-button type="button" [disabled]="busy()" (click)="assign(me)">Take it</button>
      }
    </div>
    @if (problem(); as problem) {
      <app-problem-banner [problem]="problem" kept="The owner is as before." />
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
    }
    .row {
      display: flex;
      gap: 8px;
      align-items: center;
    }
    mat-form-field {
      max-width: 280px;
    }
  `,
})
export class OwnerChoice {
  private readonly triage = inject(DropTriage);
  private readonly session = inject(SessionStore);

  readonly drop = input.required<DropView>();
  readonly assigned = output<DropView>();

  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  /** An owner who left the team is still shown as long as the drop is theirs. */
  protected readonly people = computed(() => {
    const { assignable, owner } = this.drop();
    return owner === null || assignable.some(({ id }) => id === owner.id) ? assignable : [...assignable, owner];
  });
  protected readonly mayTake = computed(() => {
    const me = this.session.person()?.id;
    const { owner, assignable } = this.drop();
    return me !== owner?.id && assignable.some(({ id }) => id === me) ? me : undefined;
  });

  /** The field keeps showing what the server has; its answer moves it. */
  protected choose({ source, value }: MatSelectChange<number>): void {
    source.value = this.drop().owner?.id ?? 0;
    this.assign(value || null);
  }

  protected assign(personId: number | null): void {
    this.busy.set(true);
    this.problem.set(null);
    this.triage.assign(this.drop().id, personId).subscribe({
      next: (drop) => {
        this.busy.set(false);
        this.assigned.emit(drop);
      },
      error: (error: unknown) => {
        this.problem.set(problemOf(error));
        this.busy.set(false);
      },
    });
  }
}
