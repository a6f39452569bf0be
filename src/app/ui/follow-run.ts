import type { HttpClient } from '@angular/common/http';
import type { JobRunView } from '@shared/contracts/job-runs';
import { exhaustMap, Observable, takeWhile, timer } from 'rxjs';

const POLL_MS = 1000;

/** A run of a job as it goes on, once a second until it ended; the run itself goes on when nobody looks. */
export function followRun(http: HttpClient, id: number): Observable<JobRunView> {
  return timer(0, POLL_MS).pipe(
    exhaustMap(() => http.get<JobRunView>(`/api/v1/runs/${id}`)),
    takeWhile((run) => isUnderWay(run), true),
  );
}

export function isUnderWay({ status }: Pick<JobRunView, 'status'>): boolean {
  return status === 'waiting' || status === 'running';
}
