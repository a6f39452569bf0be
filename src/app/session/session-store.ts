import { HttpClient } from '@angular/common/http';
import { computed, inject, Injectable, signal } from '@angular/core';
import { catchError, map, Observable, of, shareReplay, switchMap, tap } from 'rxjs';
import type { SessionTeam, SessionView } from '@shared/contracts/session';

/** Who is signed in and which teams they belong to; the single source for guards, shell and pages. */
@Injectable({ providedIn: 'root' })
export class SessionStore {
  private readonly http = inject(HttpClient);
  private readonly answer = signal<SessionView | undefined>(undefined);
  private loading: Observable<SessionView> | undefined;

  readonly known = computed(() => this.answer() !== undefined);
  readonly person = computed(() => this.answer()?.person ?? null);
  readonly teams = computed(() => this.answer()?.teams ?? []);
  readonly demo = computed(() => this.answer()?.demo ?? false);
  readonly mailbox = computed(() => this.answer()?.mailbox ?? false);
  readonly demoSignIns = computed(() => this.answer()?.demoSignIns ?? []);
  readonly isAdministrator = computed(() => this.person()?.isAdministrator ?? false);

  team(key: string): SessionTeam | undefined {
    return this.teams().find((team) => team.key === key);
  }

  /** Asks the server once; later callers get the same answer until `reload`. */
  load(): Observable<SessionView> {
    const answer = this.answer();
    if (answer) return of(answer);
    this.loading ??= this.http.get('/api/csrf').pipe(
      switchMap(() => this.reload()),
      shareReplay({ bufferSize: 1, refCount: false }),
      catchError((error: unknown) => {
        this.loading = undefined;
        throw error;
      }),
    );
    return this.loading;
  }

  reload(): Observable<SessionView> {
    return this.http.get<SessionView>('/api/session').pipe(tap((session) => this.answer.set(session)));
  }

  signIn(email: string, password: string): Observable<SessionView> {
    return this.http.post('/api/session', { email, password }).pipe(switchMap(() => this.reload()));
  }

  signOut(): Observable<void> {
    return this.leave('/api/session');
  }

  signOutEverywhere(): Observable<void> {
    return this.leave('/api/session/everywhere');
  }

  /** The session is over: the next `load` asks anew, with a fresh CSRF token for the next form. */
  forget(): void {
    this.answer.set(undefined);
    this.loading = undefined;
  }

  private leave(path: string): Observable<void> {
    return this.http.delete(path).pipe(map(() => this.forget()));
  }
}
