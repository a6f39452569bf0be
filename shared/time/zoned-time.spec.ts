import { momentOf, wallTimeOf } from './zoned-time';

// Offsets: IANA time zone database. Stockholm is UTC+1, UTC+2 from 29 March 2026 to 25 October 2026, each at 01:00 UTC
// (Directive 2000/84/EC); Kolkata is UTC+5:30 all year, New York UTC-5 in winter and UTC-4 in summer.
const BOTH_WAYS = [
  ['2026-03-02T09:20', 'Europe/Stockholm', '2026-03-02T08:20:00.000Z'],
  ['2026-07-02T09:20', 'Europe/Stockholm', '2026-07-02T07:20:00.000Z'],
  ['2026-03-02T09:20', 'Asia/Kolkata', '2026-03-02T03:50:00.000Z'],
  ['2026-01-01T00:10', 'America/New_York', '2026-01-01T05:10:00.000Z'],
  ['2026-07-25T23:05', 'America/New_York', '2026-07-26T03:05:00.000Z'],
  ['2026-03-02T09:20', 'UTC', '2026-03-02T09:20:00.000Z'],
] as const;

describe('momentOf', () => {
  it.each(BOTH_WAYS)('reads %s in %s as %s', (wallTime, zone, moment) => {
    expect(momentOf(wallTime, zone)).toBe(moment);
  });

  it('keeps seconds', () => {
    expect(momentOf('2026-03-02T09:20:15', 'Europe/Stockholm')).toBe('2026-03-02T08:20:15.000Z');
  });

  // RFC 5545, 3.3.5.
  it('takes the first of an hour that comes twice, and counts on over the hour that a change of clocks skips', () => {
    expect(momentOf('2026-10-25T02:30', 'Europe/Stockholm')).toBe('2026-10-25T00:30:00.000Z');
    expect(momentOf('2026-03-29T02:30', 'Europe/Stockholm')).toBe('2026-03-29T01:30:00.000Z');
  });

  it('knows the hours beside a change of clocks', () => {
    expect(momentOf('2026-10-25T01:59', 'Europe/Stockholm')).toBe('2026-10-24T23:59:00.000Z');
    expect(momentOf('2026-10-25T03:00', 'Europe/Stockholm')).toBe('2026-10-25T02:00:00.000Z');
    expect(momentOf('2026-03-29T01:59', 'Europe/Stockholm')).toBe('2026-03-29T00:59:00.000Z');
    expect(momentOf('2026-03-29T03:00', 'Europe/Stockholm')).toBe('2026-03-29T01:00:00.000Z');
  });

  it('knows nothing of an empty field', () => {
    expect(momentOf('', 'UTC')).toBeUndefined();
  });
});

describe('wallTimeOf', () => {
  it.each(BOTH_WAYS)('shows %s in %s for %s', (wallTime, zone, moment) => {
    expect(wallTimeOf(moment, zone)).toBe(wallTime);
    expect(wallTimeOf(Date.parse(moment), zone)).toBe(wallTime);
  });
});
