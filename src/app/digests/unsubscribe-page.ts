import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Problem } from '@shared/contracts/problem';
import { AuthFrame } from '../session/auth-frame';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';

/** Where the link at the foot of every digest leads. Opening it changes nothing, for mail programs open links ahead. */
@Component({
  selector: 'app-unsubscribe-page',
  imports: [AuthFrame, MatButton, ProblemBanner],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-auth-frame title="Weekly digest">
      @if (isDone()) {
        <p role="status">
          Done: this address gets no more digests from the team. Should you want it back, ask a lead of the team, or
          switch it on yourself on the team's digest page.
        </p>
      } @else {
        <p>Do you want to stop the weekly digest to this address? Drops and results stay as they are.</p>
        @if (problem(); as problem) {
          <app-problem-banner [problem]="problem" kept="You are still subscribed." />
        }
        <div class="form-actions">
          <button mat-flat-button type="button" [disabled]="busy()" (click)="unsubscribe()">Stop the digest</button>
        </div>
      }
    </app-auth-frame>
  `,
})
export class UnsubscribePage {
  private readonly http = inject(HttpClient);

  readonly secret = input.required<string>();

  protected readonly busy = signal(false);
  protected readonly isDone = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected unsubscribe(): void {
    this.busy.set(true);
    this.problem.set(null);
    this.http.post(`/api/digest/unsubscribe/${encodeURIComponent(this.secret())}`, {}).subscribe({
      next: () => this.isDone.set(true),
      error: (error: unknown) => {
        this.problem.set(problemOf(error));
        this.busy.set(false);
      },
    });
  }
}
