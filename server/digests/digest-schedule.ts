import { momentOf, wallTimeOf } from '@shared/time/zoned-time';

const DAY_MS = 24 * 3600_000;
const WEEK_DAYS = 7;

export interface WeeklyTime {
  /** 1 Monday ... 7 Sunday, in the zone. */
  weekday: number;
  /** 0-23, in the zone. */
  hour: number;
  /** IANA name. */
  timeZone: string;
}

/** A day as the calendar on the wall of a zone shows it. */
interface LocalDay {
  year: number;
  month: number;
  day: number;
  /** 1 Monday ... 7 Sunday. */
  weekday: number;
}

/** @param at UTC milliseconds */
function localDay(at: number, timeZone: string): LocalDay {
  const [year = 0, month = 0, day = 0] = wallTimeOf(at, timeZone).split(/\D/).map(Number);
  const sundayFirst = new Date(Date.UTC(year, month - 1, day)).getUTCDay();
  return { year, month, day, weekday: sundayFirst === 0 ? WEEK_DAYS : sundayFirst };
}

/**
 * When the digest last fell due, at or before `at`. A change of summer time shifts the moment with the wall clock; an
 * hour that does not exist on the day counts from the one after it.
 *
 * @returns UTC milliseconds
 */
export function lastDue(at: number, { weekday, hour, timeZone }: WeeklyTime): number {
  const now = localDay(at, timeZone);
  const daysSince = (now.weekday - weekday + WEEK_DAYS) % WEEK_DAYS;
  const due = atWallTime(now.year, now.month, now.day - daysSince, hour, timeZone);
  return due <= at ? due : atWallTime(now.year, now.month, now.day - daysSince - WEEK_DAYS, hour, timeZone);
}

/** When the digest falls due next, after `at`, UTC milliseconds. */
export function nextDue(at: number, weekly: WeeklyTime): number {
  const last = localDay(lastDue(at, weekly), weekly.timeZone);
  return atWallTime(last.year, last.month, last.day + WEEK_DAYS, weekly.hour, weekly.timeZone);
}

/** ISO 8601 week of a moment in a zone, such as `2026-W49`. */
export function isoWeek(at: number, timeZone: string): string {
  const { year, month, day, weekday } = localDay(at, timeZone);
  // The Thursday of a week decides which year it belongs to (ISO 8601).
  const thursday = new Date(Date.UTC(year, month - 1, day - weekday + 4));
  const firstOfYear = Date.UTC(thursday.getUTCFullYear(), 0, 1);
  const week = Math.floor((thursday.getTime() - firstOfYear) / (WEEK_DAYS * DAY_MS)) + 1;
  return `${thursday.getUTCFullYear()}-W${String(week).padStart(2, '0')}`;
}

/** The moment at which the wall clock of the zone shows this date and full hour; `day` may lie outside the month. */
function atWallTime(year: number, month: number, day: number, hour: number, timeZone: string): number {
  const shown = new Date(Date.UTC(year, month - 1, day, hour)).toISOString().slice(0, -1);
  return Date.parse(momentOf(shown, timeZone) ?? '');
}
