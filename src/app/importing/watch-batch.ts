import type { ImportBatchView } from '@shared/contracts/imports';
import type { Problem } from '@shared/contracts/problem';
import { Observable, repeat, retry, takeWhile, throwError, timer } from 'rxjs';
import { problemOf } from '../ui/problem';

const POLL_MS = 1000;
/** While the server does not answer. */
const RETRY_MS = 5000;

export type BatchNews = { batch: ImportBatchView } | { problem: Problem };

/** Asks for a batch until it is finished. A server that does not answer is asked again; any other refusal ends it. */
export function watchBatch(ask: Observable<ImportBatchView>): Observable<BatchNews> {
  return new Observable<BatchNews>((news) => {
    const asked = ask.pipe(
      repeat({ delay: POLL_MS }),
      takeWhile(({ finishedAt }) => finishedAt === null, true),
      retry({
        delay: (error: unknown) => {
          const problem = problemOf(error);
          if (problem.status !== 0 && problem.status < 500) return throwError(() => error);
          news.next({ problem });
          return timer(RETRY_MS);
        },
      }),
    );
    return asked.subscribe({
      next: (batch) => news.next({ batch }),
      error: (error: unknown) => {
        news.next({ problem: problemOf(error) });
        news.complete();
      },
      complete: () => news.complete(),
    });
  });
}
