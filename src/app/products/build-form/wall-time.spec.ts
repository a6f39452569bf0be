import { isoOfWallTime, wallTimeOf } from './wall-time';

// Changes of the clocks in the European Union 2026: 29 March and 25 October at 01:00 UTC (Directive 2000/84/EC).
describe('wall time of a zone', () => {
  it.each([
    ['2026-11-26T05:00:00.000Z', 'Europe/Stockholm', '2026-11-26T06:00'],
    ['2026-07-26T05:00:00.000Z', 'Europe/Stockholm', '2026-07-26T07:00'],
    ['2026-07-26T23:30:00.000Z', 'Asia/Kolkata', '2026-07-27T05:00'],
    ['2026-07-26T03:05:00.000Z', 'America/New_York', '2026-07-25T23:05'],
    ['2026-07-26T00:00:00.000Z', 'UTC', '2026-07-26T00:00'],
  ])('shows %s in %s as %s and reads it back', (iso, zone, wallTime) => {
    expect(wallTimeOf(iso, zone)).toBe(wallTime);
    expect(isoOfWallTime(wallTime, zone)).toBe(iso);
  });

  it('takes the first of two where clocks go back', () => {
    expect(isoOfWallTime('2026-10-25T02:30', 'Europe/Stockholm')).toBe('2026-10-25T00:30:00.000Z');
  });

  it('goes on past a time that clocks skip', () => {
    expect(isoOfWallTime('2026-03-29T02:30', 'Europe/Stockholm')).toBe('2026-03-29T01:30:00.000Z');
  });

  it('refuses what is no time', () => {
    expect(() => isoOfWallTime('', 'UTC')).toThrow(RangeError);
  });
});
