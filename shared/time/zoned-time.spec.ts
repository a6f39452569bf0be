import { momentOf, wallTimeOf } from './zoned-time';

// Offsets: IANA time zone database. Stockholm is UTC+1, UTC+2 from 29 March 2026 02:00 to 25 October 2026 03:00;
// Kolkata is UTC+5:30 all year, New York UTC-5 in winter.
describe('momentOf', () => {
  it.each([
    ['2026-03-02T09:20', 'Europe/Stockholm', '2026-03-02T08:20:00.000Z'],
    ['2026-07-02T09:20', 'Europe/Stockholm', '2026-07-02T07:20:00.000Z'],
    ['2026-03-02T09:20', 'Asia/Kolkata', '2026-03-02T03:50:00.000Z'],
    ['2026-01-01T00:10', 'America/New_York', '2026-01-01T05:10:00.000Z'],
    ['2026-03-02T09:20', 'UTC', '2026-03-02T09:20:00.000Z'],
  ])('reads %s in %s as %s', (wallTime, zone, moment) => {
    expect(momentOf(wallTime, zone)).toBe(moment);
  });

  it('counts on over the hour that a change of clocks skips, and takes the second of an hour that comes twice', () => {
    expect(momentOf('2026-03-29T02:30', 'Europe/Stockholm')).toBe('2026-03-29T01:30:00.000Z');
    expect(momentOf('2026-10-25T02:30', 'Europe/Stockholm')).toBe('2026-10-25T01:30:00.000Z');
    expect(momentOf('2026-10-25T01:59', 'Europe/Stockholm')).toBe('2026-10-24T23:59:00.000Z');
  });

  it('knows nothing of an empty field', () => {
    expect(momentOf('', 'UTC')).toBeUndefined();
  });
});

describe('wallTimeOf', () => {
  it('gives back what was typed', () => {
    for (const zone of ['Europe/Stockholm', 'Asia/Kolkata', 'America/New_York']) {
      expect(wallTimeOf(momentOf('2026-03-02T09:20', zone) ?? '', zone)).toBe('2026-03-02T09:20');
    }
  });
});
