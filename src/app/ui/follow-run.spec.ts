import type { HttpClient } from '@angular/common/http';
import type { JobRunView } from '@shared/contracts/job-runs';
import { of } from 'rxjs';
import { followRun } from './follow-run';

it('asks once a second until the run ended, and hands on its end', () => {
  jest.useFakeTimers();
  const answers = ['waiting', 'running', 'done'].map((status) => ({ id: 7, status }) as JobRunView);
  const get = jest.fn(() => of(answers.shift()));
  const seen: string[] = [];
  let isComplete = false;
  followRun({ get } as unknown as HttpClient, 7).subscribe({
    next: ({ status }) => seen.push(status),
    complete: () => (isComplete = true),
  });
  jest.advanceTimersByTime(10_000);
  expect(seen).toEqual(['waiting', 'running', 'done']);
  expect(isComplete).toBe(true);
  expect(get).toHaveBeenCalledTimes(3);
  expect(get).toHaveBeenCalledWith('/api/v1/runs/7');
  jest.useRealTimers();
});
