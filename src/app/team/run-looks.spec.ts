import type { JobRunView } from '@shared/contracts/job-runs';
import { askedBy, countWords, durationText } from './run-looks';

const RUN = { startedAt: '2026-12-01T14:48:00.000Z', finishedAt: null } as JobRunView;
const NOW = Date.parse('2026-12-01T14:51:05Z');

it.each([
  [{ ...RUN, startedAt: null }, ''],
  [{ ...RUN, finishedAt: '2026-12-01T14:48:00.420Z' }, '0.4 s'],
  [{ ...RUN, finishedAt: '2026-12-01T14:48:12.000Z' }, '12 s'],
  [RUN, '3 min 5 s'],
])('says how long a run took', (run, words) => {
  expect(durationText(run, NOW)).toBe(words);
});

it('writes counts with their names', () => {
  expect(countWords({ judged: 3, dropsRaised: 1 })).toBe('judged 3, drops raised 1');
  expect(countWords({})).toBe('');
});

it('names who asked', () => {
  expect(askedBy({ trigger: 'person', requestedBy: 'Runa Fellgarth' })).toBe('Runa Fellgarth');
  expect(askedBy({ trigger: 'token', requestedBy: 'bench-2' })).toBe('token bench-2');
  expect(askedBy({ trigger: 'schedule', requestedBy: 'judge' })).toBe('schedule');
});
