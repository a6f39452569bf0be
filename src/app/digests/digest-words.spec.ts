import { hourText, nextWords, periodWords, sendingWords } from './digest-words';

describe('the next digest', () => {
  it("is dated on the clocks of the team's zone", () => {
    const next = { isOn: true, nextAt: '2026-12-07T06:00:00.000Z', timeZone: 'Europe/Stockholm' };
    expect(nextWords(next)).toBe('The next one goes out on Monday 7 Dec 2026, 07:00 in Europe/Stockholm.');
    const tokyo = { ...next, nextAt: '2026-12-06T22:00:00.000Z', timeZone: 'Asia/Tokyo' };
    expect(nextWords(tokyo)).toContain('Monday 7 Dec 2026, 07:00 in Asia/Tokyo');
  });

  it('is none while the digest is off', () => {
    expect(nextWords({ isOn: false, nextAt: null, timeZone: 'UTC' })).toBe('The digest is off: nobody gets one.');
  });
});

it('names the week of a digest, or that somebody asked for it', () => {
  expect([periodWords('2026-W49'), periodWords('now-9')]).toEqual(['2026-W49', 'on request']);
});

it('writes full hours', () => {
  expect([hourText(0), hourText(7), hourText(23)]).toEqual(['00:00', '07:00', '23:00']);
});

it('says how far a digest has come, and why it failed', () => {
  expect(sendingWords({ status: 'done', errors: [] })).toBe('It is on its way to you.');
  expect(sendingWords({ status: 'failed', errors: [{ subject: 'mail', message: 'no route' }] })).toContain('no route');
});
