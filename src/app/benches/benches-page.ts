import { HttpClient, httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatSnackBar } from '@angular/material/snack-bar';
import type { BenchInput, BenchPatch, BenchView } from '@shared/contracts/benches';
import type { Problem } from '@shared/contracts/problem';
import type { Observable } from 'rxjs';
import { CurrentTeam } from '../session/current-team';
import { EmptyState } from '../ui/empty-state';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { BenchCard } from './bench-card';
import { BenchCautions } from './bench-cautions';
import { BenchForm } from './bench-form';

/** The benches of the team, with the cautions of working at one. */
@Component({
  selector: 'app-benches-page',
  imports: [BenchCard, BenchCautions, BenchForm, EmptyState, MatButton, MatIcon, PageHeader, ProblemBanner, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './benches-page.html',
  styles: `
    .benches {
      display: grid;
      grid-template-columns: repeat(auto-fill, minmax(min(440px, 100%), 1fr));
      gap: 16px;
      align-items: start;
    }
    .wide {
      grid-column: 1 / -1;
    }
    h2 {
      margin-bottom: 12px;
    }
  `,
})
export class BenchesPage {
  private readonly http = inject(HttpClient);
  private readonly snackBar = inject(MatSnackBar);
  private readonly current = inject(CurrentTeam);

  readonly team = input.required<string>();

  private readonly path = computed(() => `/api/teams/${encodeURIComponent(this.team())}/benches`);
  protected readonly benches = httpResource<BenchView[]>(() => this.path());
  /** Benches in use first; the archived ones stay in view because sweeps name them. */
  protected readonly sorted = computed(() => {
    if (!this.benches.hasValue()) return undefined;
    return [...this.benches.value()].sort((a, b) => Number(a.isArchived) - Number(b.isArchived));
  });
  protected readonly loadProblem = computed(() => {
    const error = this.benches.error();
    return error ? problemOf(error) : null;
  });
  protected readonly mayEdit = computed(() => this.current.may('benches.edit'));

  /** Key of the bench in the form; empty for a new one. */
  protected readonly editedKey = signal<string | null>(null);
  protected readonly isSaving = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected edit(key: string | null): void {
    this.problem.set(null);
    this.editedKey.set(key);
  }

  protected add(input: BenchInput): void {
    this.send(this.http.post<BenchView>(this.path(), input), `${input.name} is added.`);
  }

  protected change(bench: BenchView, { name, location, lisn, receiver, notes }: BenchInput): void {
    this.patch(bench, { name, location, lisn, receiver, notes }, `${name} is saved.`);
  }

  protected archive(bench: BenchView, isArchived: boolean): void {
    const words = isArchived ? 'takes no more sweeps; what it measured stays.' : 'is back in use.';
    this.patch(bench, { isArchived }, `${bench.name} ${words}`);
  }

  private patch({ key }: BenchView, patch: BenchPatch, words: string): void {
    this.send(this.http.patch<BenchView>(`${this.path()}/${key}`, patch), words);
  }

  private send(request: Observable<BenchView>, words: string): void {
    this.isSaving.set(true);
    this.problem.set(null);
    request.subscribe({
      next: () => {
        this.isSaving.set(false);
        this.editedKey.set(null);
        this.benches.reload();
        this.snackBar.open(words, undefined, { duration: 5000 });
      },
      error: (error: unknown) => {
        this.isSaving.set(false);
        this.problem.set(problemOf(error));
      },
    });
  }
}
