import { isoWeek, lastDue, nextDue } from './digest-schedule';

const utc = (text: string) => Date.parse(text);
const mondaySeven = { weekday: 1, hour: 7 };

describe('the hour of the digest', () => {
  it('is the wall clock of the team, summer and winter', () => {
    const stockholm = { ...mondaySeven, timeZone: 'Europe/Stockholm' };
    expect(lastDue(utc('2026-01-07T12:00Z'), stockholm)).toBe(utc('2026-01-05T06:00Z'));
    expect(lastDue(utc('2026-07-08T12:00Z'), stockholm)).toBe(utc('2026-07-06T05:00Z'));
  });

  it('moves with summer time between one week and the next (clocks go forward in the EU on 2026-03-29)', () => {
    const stockholm = { ...mondaySeven, timeZone: 'Europe/Stockholm' };
    expect(nextDue(utc('2026-03-23T06:00Z'), stockholm)).toBe(utc('2026-03-30T05:00Z'));
  });

  it('is due from the very moment on and not a minute before', () => {
    const chicago = { ...mondaySeven, timeZone: 'America/Chicago' };
    expect(lastDue(utc('2026-12-07T13:00Z'), chicago)).toBe(utc('2026-12-07T13:00Z'));
    expect(lastDue(utc('2026-12-07T12:59Z'), chicago)).toBe(utc('2026-11-30T13:00Z'));
  });

  it('crosses the date line of the zone', () => {
    const tokyo = { ...mondaySeven, timeZone: 'Asia/Tokyo' };
    expect(lastDue(utc('2026-11-29T23:00Z'), tokyo)).toBe(utc('2026-11-29T22:00Z'));
    expect(nextDue(utc('2026-11-29T23:00Z'), tokyo)).toBe(utc('2026-12-06T22:00Z'));
  });
});

describe('isoWeek', () => {
  // Source: ISO 8601 as worked in Wikipedia, "ISO week date": 2005-01-01 is 2004-W53-6, 2007-01-01 is 2007-W01-1,
  // 2008-12-29 is 2009-W01-1, 2010-01-03 is 2009-W53-7 (from memory).
  it.each([
    ['2005-01-01T12:00Z', '2004-W53'],
    ['2007-01-01T12:00Z', '2007-W01'],
    ['2008-12-29T12:00Z', '2009-W01'],
    ['2010-01-03T12:00Z', '2009-W53'],
  ])('puts %s into %s', (at, week) => {
    expect(isoWeek(utc(at), 'UTC')).toBe(week);
  });

  it('goes by the date in the zone', () => {
    expect(isoWeek(utc('2026-11-29T23:30Z'), 'Asia/Tokyo')).toBe('2026-W49');
    expect(isoWeek(utc('2026-11-29T23:30Z'), 'America/Chicago')).toBe('2026-W48');
  });
});
