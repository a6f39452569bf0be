import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal, untracked } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { AuditEntryView, AuditPage } from '@shared/contracts/audit';
import type { Problem } from '@shared/contracts/problem';
import { EmptyState } from '../empty-state';
import { problemOf } from '../problem';
import { ProblemBanner } from '../problem-banner';
import { Skeleton } from '../skeleton';
import { TimeStamp } from '../time-stamp';
import { auditChanges } from './audit-changes';
import { matchesText } from './matches-text';

/** An audit log: newest first, a page at a time, searched in what is loaded. */
@Component({
  selector: 'app-audit-log',
  imports: [EmptyState, MatButton, MatFormFieldModule, MatInput, ProblemBanner, Skeleton, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './audit-log.html',
  styleUrl: './audit-log.scss',
})
export class AuditLog {
  private readonly http = inject(HttpClient);

  /** Where the log is read from, such as /api/teams/charging/audit. */
  readonly path = input.required<string>();

  private readonly loaded = signal<readonly AuditEntryView[] | undefined>(undefined);
  protected readonly nextBefore = signal<number | null>(null);
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly text = signal('');

  protected readonly count = computed(() => this.loaded()?.length ?? 0);
  protected readonly rows = computed(() =>
    this.loaded()
      ?.filter((entry) => matchesText(entry, this.text()))
      .map((entry) => ({ entry, changes: auditChanges(entry.details) })),
  );

  constructor() {
    effect(() => {
      this.path();
      untracked(() => {
        this.loaded.set(undefined);
        this.nextBefore.set(null);
        this.loadMore();
      });
    });
  }

  protected search(text: string): void {
    this.text.set(text);
  }

  protected loadMore(): void {
    const before = this.nextBefore();
    this.busy.set(true);
    this.problem.set(null);
    this.http.get<AuditPage>(this.path(), { params: before === null ? {} : { before } }).subscribe({
      next: ({ entries, nextBefore }) => {
        this.loaded.update((loaded) => [...(loaded ?? []), ...entries]);
        this.nextBefore.set(nextBefore);
        this.busy.set(false);
      },
      error: (error: unknown) => {
        this.problem.set(problemOf(error));
        this.busy.set(false);
      },
    });
  }
}
