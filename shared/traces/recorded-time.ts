import type { PreambleLine } from './preamble';

/** When a file says it was recorded. */
export interface RecordedTime {
  /** As the clock of the instrument showed it, in the form of ISO 8601: "2026-03-02T09:20:15". */
  readonly wallTime: string;
  /** "Z" or "+01:00"; null where the file names no offset. */
  readonly offset: string | null;
  /** Line of the file that states the date, from 1. */
  readonly line: number;
}

const TIME_KEY = /date|time|taken|measured|recorded|started/i;
/** Dates of something other than the start of the measurement. */
const OTHER_TIME_KEY = /calib|\bcal\b|due|valid|firmware|software|version|print|export|report|stop|\bend|finish/i;
/** "Measurement time" and "sweep time" are durations, which look just the same. */
const TIME_OF_DAY_KEY = /^(?:start\s*)?time(?:\s*of\s*day)?$/i;
const WEEKDAY = /^(?:mon|tue|wed|thu|fri|sat|sun)[a-z]*[.,]?\s+/i;
const YEAR_FIRST = /^(?<year>\d{4})(?<mark>[-/.])(?<month>\d{1,2})\k<mark>(?<day>\d{1,2})(?!\d)/;
const DAY_FIRST = /^(?<day>\d{1,2})\.\s?(?<month>\d{1,2})\.\s?(?<year>\d{4})(?!\d)/;
const DAY_AND_NAME = /^(?<day>\d{1,2})[\s.-]{1,2}(?<name>[a-z]{3,9})[\s.,-]{1,2}(?<year>\d{4})(?!\d)/i;
const NAME_AND_DAY = /^(?<name>[a-z]{3,9})\.?\s(?<day>\d{1,2})(?:st|nd|rd|th)?,?\s(?<year>\d{4})(?!\d)/i;
const EITHER_FIRST = /^(?<one>\d{1,2})(?<mark>[-/])(?<other>\d{1,2})\k<mark>(?<year>\d{4})(?!\d)/;
const TIME_OF_DAY =
  /^(?<hour>\d{1,2}):(?<minute>\d{2})(?::(?<second>\d{2})(?:[.,]\d+)?)?(?:\s*(?<half>[ap])\.?m\.?)?\s*(?<offset>Z|UTC|GMT|[+-](?:0\d|1[0-4]):?[0-5]\d)?$/i;
const MONTHS = 'january february march april may june july august september october november december'.split(' ');
/** No receiver that writes files is older. */
const FIRST_YEAR = 1980;

/**
 * Finds when a file was recorded in the lines above its table: date and time in one line, or each in its own. A date that can
 * be read in two ways, such as 03/02/2026, is none; neither is one without a time of day.
 * @param preamble lines above the table
 * @returns the first such time; null when the file states none without doubt
 * Source: ISO 8601-1:2019 for year-first dates; D.M.Y with points and month names (common practice, no source).
 * Example: "Date;02.03.2026" and "Time;09:20:15" give 2026-03-02T09:20:15.
 */
export function recordedTime(preamble: readonly PreambleLine[]): RecordedTime | null {
  let dayAlone: { date: string; line: number } | undefined;
  for (const { line, key, value } of preamble) {
    if (!TIME_KEY.test(key) || OTHER_TIME_KEY.test(key)) continue;
    const found = leadingDate(value.replace(WEEKDAY, ''));
    if (found === undefined) continue;
    const { date, rest } = found;
    const time = timeOfDay(rest);
    if (time !== undefined) return { wallTime: `${date}T${time.time}`, offset: time.offset, line };
    if (rest === '') dayAlone ??= { date, line };
  }
  if (dayAlone === undefined) return null;
  for (const { key, value } of preamble) {
    const time = TIME_OF_DAY_KEY.test(key) ? timeOfDay(value) : undefined;
    if (time !== undefined) {
      return { wallTime: `${dayAlone.date}T${time.time}`, offset: time.offset, line: dayAlone.line };
    }
  }
  return null;
}

/** The date a text begins with, and what comes after it. */
function leadingDate(text: string): { date: string; rest: string } | undefined {
  const match = [YEAR_FIRST, DAY_FIRST, DAY_AND_NAME, NAME_AND_DAY, EITHER_FIRST]
    .map((form) => form.exec(text))
    .find((found) => found !== null);
  if (!match?.groups) return undefined;
  const { year, month, day, name, one, other } = match.groups;
  const date =
    one === undefined
      ? dateOf(Number(year), name === undefined ? Number(month) : monthNamed(name), Number(day))
      : eitherDate(Number(year), Number(one), Number(other));
  const rest = text.slice(match[0].length).replace(/^[T\s,;]+/, '');
  return date === undefined ? undefined : { date, rest };
}

/** With slashes some write the day first and some the month: known only where one of them cannot be a month. */
function eitherDate(year: number, one: number, other: number): string | undefined {
  if (one === other || one > 12) return dateOf(year, other, one);
  return other > 12 ? dateOf(year, one, other) : undefined;
}

/** From 1; 0 for no name of a month. */
function monthNamed(name: string): number {
  return MONTHS.findIndex((month) => month.startsWith(name.toLowerCase())) + 1;
}

/** Undefined for a day that no calendar has. */
function dateOf(year: number, month: number, day: number): string | undefined {
  const date = new Date(Date.UTC(year, month - 1, day));
  const isThere = date.getUTCMonth() === month - 1 && date.getUTCDate() === day && year >= FIRST_YEAR;
  return isThere ? date.toISOString().slice(0, 10) : undefined;
}

function timeOfDay(text: string): { time: string; offset: string | null } | undefined {
  const groups = TIME_OF_DAY.exec(text.trim())?.groups;
  if (!groups) return undefined;
  const { hour: written, minute, second = '00', half, offset } = groups;
  const hour = half === undefined ? Number(written) : hourOf(Number(written), half.toLowerCase() === 'p');
  if (!(hour <= 23) || Number(minute) > 59 || Number(second) > 59) return undefined;
  return { time: `${String(hour).padStart(2, '0')}:${minute}:${second}`, offset: offset ? isoOffset(offset) : null };
}

/** Of a clock of twelve hours; NaN for an hour it does not have. */
function hourOf(hour: number, isAfternoon: boolean): number {
  return hour < 1 || hour > 12 ? NaN : (hour % 12) + (isAfternoon ? 12 : 0);
}

function isoOffset(offset: string): string {
  return /^[+-]/.test(offset) ? `${offset.slice(0, 3)}:${offset.slice(-2)}` : 'Z';
}
