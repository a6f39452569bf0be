import type { JobRunView } from '@shared/contracts/job-runs';
import { judgingSentence } from './judging-sentence';

const run = (given: Partial<JobRunView>) => ({ status: 'done', total: 0, done: 0, errors: [], ...given }) as JobRunView;

it.each([
  [[], ''],
  [[run({}), run({})], 'Everything was judged already.'],
  [[run({ total: 1, done: 1 }), run({})], '1 build judged.'],
  [
    [run({ total: 3, done: 3 }), run({ status: 'waiting' })],
    'Judging: 1 of 2 products done, 3 of 3 builds judged. You may leave the page.',
  ],
  [[run({ status: 'running' })], 'Judging: 0 of 1 products done. You may leave the page.'],
  [
    [run({ total: 2, done: 2, errors: [{ subject: 'C2', message: 'gone' }] })],
    'Judged, with errors in 1 of 1 runs: see below.',
  ],
  [[run({ status: 'failed' }), run({})], 'Judged, with errors in 1 of 2 runs: see below.'],
])('case %#', (runs, sentence) => {
  expect(judgingSentence(runs)).toBe(sentence);
});
