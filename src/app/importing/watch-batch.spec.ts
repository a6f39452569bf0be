import { HttpErrorResponse } from '@angular/common/http';
import type { ImportBatchView } from '@shared/contracts/imports';
import { defer, of, throwError } from 'rxjs';
import { TestScheduler } from 'rxjs/testing';
import { BatchNews, watchBatch } from './watch-batch';

const batch = (waiting: number): ImportBatchView => ({
  id: 3,
  createdAt: '2026-03-02T08:20:00Z',
  createdBy: 'T. Orrow',
  finishedAt: waiting === 0 ? '2026-03-02T08:21:00Z' : null,
  total: 2,
  imported: 2 - waiting,
  duplicate: 0,
  refused: 0,
  waiting,
  run: null,
  items: [],
});

/** Watches a server that gives one answer after the other, in virtual time. */
function watch(answers: readonly (ImportBatchView | HttpErrorResponse)[]): { news: BatchNews[]; atMs: number[] } {
  const news: BatchNews[] = [];
  const atMs: number[] = [];
  const scheduler = new TestScheduler(() => undefined);
  scheduler.run(() => {
    let call = 0;
    const ask = defer(() => {
      const answer = answers[call++];
      return answer instanceof HttpErrorResponse ? throwError(() => answer) : of(answer);
    });
    watchBatch(ask).subscribe((one) => {
      news.push(one);
      atMs.push(scheduler.now());
    });
  });
  return { news, atMs };
}

describe('watchBatch', () => {
  it('asks every second until the batch is finished', () => {
    const { news, atMs } = watch([batch(2), batch(1), batch(0), batch(0)]);
    expect(news).toEqual([{ batch: batch(2) }, { batch: batch(1) }, { batch: batch(0) }]);
    expect(atMs).toEqual([0, 1000, 2000]);
  });

  it('tells that the server does not answer, and goes on', () => {
    const { news, atMs } = watch([batch(2), new HttpErrorResponse({ status: 0 }), batch(0)]);
    expect(news).toEqual([
      { batch: batch(2) },
      { problem: expect.objectContaining({ status: 0 }) },
      { batch: batch(0) },
    ]);
    expect(atMs).toEqual([0, 1000, 6000]);
  });

  it('gives up on a batch that is not there', () => {
    const { news } = watch([new HttpErrorResponse({ status: 404 }), batch(0)]);
    expect(news).toEqual([{ problem: expect.objectContaining({ status: 404 }) }]);
  });
});
