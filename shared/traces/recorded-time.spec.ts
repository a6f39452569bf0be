import { readPreamble } from './preamble';
import { recordedTime } from './recorded-time';

const timeIn = (...lines: string[]) =>
  recordedTime(
    readPreamble(
      lines.map((text, index) => ({ number: index + 1, offset: 0, text })),
      ';',
    ),
  );
const at = (...lines: string[]) => {
  const found = timeIn(...lines);
  return found && found.wallTime + (found.offset ?? '');
};

describe('recordedTime', () => {
  // ISO 8601-1:2019, 5.4 (date and time of day); the rest is common practice, no source.
  it.each([
    ['Date;2026-03-02T09:20:15', '2026-03-02T09:20:15'],
    ['Date: 2026-03-02 09:20:15.250', '2026-03-02T09:20:15'],
    ['Timestamp;2026-03-02T09:20:15Z', '2026-03-02T09:20:15Z'],
    ['Timestamp;2026-03-02T09:20:15+0100', '2026-03-02T09:20:15+01:00'],
    ['Measured = 2026/03/02 09:20', '2026-03-02T09:20:00'],
    ['Date and time;02.03.2026;09:20:15', '2026-03-02T09:20:15'],
    ['# Start time: 2.3.2026 9:20', '2026-03-02T09:20:00'],
    ['Date/Time;02-Mar-2026 09:20:15', '2026-03-02T09:20:15'],
    ['Date;Monday, March 2, 2026 9:20 PM', '2026-03-02T21:20:00'],
    ['Date;Mar 2 2026 12:05:00 am', '2026-03-02T00:05:00'],
    ['Date;13/02/2026 09:20', '2026-02-13T09:20:00'],
    ['Date;02/13/2026 09:20', '2026-02-13T09:20:00'],
  ])('reads %s', (line, time) => {
    expect(at(line)).toBe(time);
  });

  it('puts a date and a time of day from two lines together', () => {
    expect(timeIn('Receiver;A', 'Time;09:20:15', 'Date;02.03.2026')).toEqual({
      wallTime: '2026-03-02T09:20:15',
      offset: null,
      line: 3,
    });
  });

  it('says which line it is from', () => {
    expect(timeIn('Operator;J', 'Date;2026-03-02 09:20')?.line).toBe(2);
  });

  it.each([
    ['a date with two readings', 'Date;03/02/2026 09:20'],
    ['a day without a time', 'Date;02.03.2026'],
    ['a day no month has', 'Date;31.02.2026 09:20'],
    ['an hour no day has', 'Date;02.03.2026 25:20'],
    ['an hour no clock of twelve has', 'Date;02.03.2026 13:20 pm'],
    ['a year of two digits', 'Date;02.03.26 09:20'],
    ['a zone by its letters, which several zones share', 'Date;02.03.2026 09:20 CST'],
    ['an offset no zone has', 'Date;2026-03-02T09:20:15+25:00'],
    ['when the receiver was calibrated', 'Calibration date;2026-03-02 09:20'],
    ['when the sweep ended', 'Stop time;2026-03-02 09:20'],
    ['when the file was exported', 'Exported at (time);2026-03-02 09:20'],
    ['a clock that was never set', 'Date;1970-01-01 00:00:05'],
    ['a bandwidth', 'RBW;9 kHz'],
  ])('takes no %s', (_what, line) => {
    expect(timeIn(line)).toBeNull();
  });

  it('takes no duration for a time of day', () => {
    expect(timeIn('Date;02.03.2026', 'Sweep time;00:01:20')).toBeNull();
    expect(timeIn('Date;02.03.2026', 'Measurement time;00:01:20')).toBeNull();
  });
});
