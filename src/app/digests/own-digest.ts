import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, DestroyRef, inject, input, output, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatSlideToggle, MatSlideToggleChange } from '@angular/material/slide-toggle';
import { RouterLink } from '@angular/router';
import type { Problem } from '@shared/contracts/problem';
import { switchMap } from 'rxjs';
import { SessionStore } from '../session/session-store';
import { followRun } from '../ui/follow-run';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { ProgressLine } from '../ui/progress-line';
import { DigestSettings } from './digest-settings';
import { sendingWords } from './digest-words';

/** The reader's own subscription, and a digest of the last seven days for them alone, now. */
@Component({
  selector: 'app-own-digest',
  imports: [MatButton, MatIcon, MatSlideToggle, ProblemBanner, ProgressLine, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <mat-slide-toggle [checked]="isMine()" [disabled]="busy()" (change)="choose($event)">
      Send it to me, {{ session.person()?.email }}
    </mat-slide-toggle>
    <div class="send">
      <button mat-stroked-button type="button" [disabled]="isSending()" (click)="send()">
        <mat-icon svgIcon="mail" />Send me one now
      </button>
      <span class="words" aria-live="polite">
        {{ words() }}
        @if (wasSent() && session.mailbox()) {
          <a routerLink="/mailbox">Look into the mailbox</a>
        }
      </span>
    </div>
    @if (isSending()) {
      <app-progress-line label="Writing the digest" />
    }
    @if (problem(); as problem) {
      <app-problem-banner [problem]="problem" kept="No digest was sent." />
    }
    <p class="muted small">
      One now holds the last seven days and goes to nobody else. It does not replace the weekly one.
    </p>
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
    }
    .send {
      display: flex;
      flex-wrap: wrap;
      gap: 8px 12px;
      align-items: center;
    }
  `,
})
export class OwnDigest {
  private readonly http = inject(HttpClient);
  private readonly settings = inject(DigestSettings);
  private readonly destroyed = inject(DestroyRef);
  protected readonly session = inject(SessionStore);

  readonly team = input.required<string>();
  readonly isMine = input.required<boolean>();
  readonly busy = input.required<boolean>();
  readonly chosen = output<boolean>();
  readonly sent = output();

  protected readonly isSending = signal(false);
  protected readonly wasSent = signal(false);
  protected readonly words = signal('');
  protected readonly problem = signal<Problem | null>(null);

  /** The switch keeps showing what the server has; its answer moves it. */
  protected choose({ source, checked }: MatSlideToggleChange): void {
    source.checked = this.isMine();
    this.chosen.emit(checked);
  }

  protected send(): void {
    this.isSending.set(true);
    this.wasSent.set(false);
    this.problem.set(null);
    this.words.set('Asking for it.');
    this.settings
      .sendMeOne(this.team())
      .pipe(
        switchMap(({ id }) => followRun(this.http, id)),
        takeUntilDestroyed(this.destroyed),
      )
      .subscribe({
        next: (run) => {
          this.words.set(sendingWords(run));
          this.wasSent.set(run.status === 'done');
        },
        error: (error: unknown) => {
          this.problem.set(problemOf(error));
          this.words.set('');
          this.isSending.set(false);
        },
        complete: () => {
          this.isSending.set(false);
          this.sent.emit();
        },
      });
  }
}
