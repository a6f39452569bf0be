const DAY_MS = 24 * 3600_000;

/**
 * The moment at which the clocks of a time zone show a wall time. Of an hour that comes twice the first is meant; an hour that
 * clocks skip counts on from before the change.
 *
 * @param wallTime as a `datetime-local` field gives it, "2026-03-02T09:20", with or without seconds
 * @param timeZone IANA name
 * @returns ISO 8601 in UTC; undefined for a text that is no wall time
 * Source: RFC 5545, 3.3.5, for hours that come twice and never.
 * Example: 2026-03-02T09:20 in Europe/Stockholm is 2026-03-02T08:20:00.000Z.
 */
export function momentOf(wallTime: string, timeZone: string): string | undefined {
  const asUtc = Date.parse(`${wallTime}Z`);
  if (Number.isNaN(asUtc)) return undefined;
  // The offsets of a day before and after are those on either side of a change of clocks.
  const candidates = [asUtc - DAY_MS, asUtc + DAY_MS].map((at) => asUtc - offsetMs(at, timeZone));
  const exact = candidates.filter((at) => at + offsetMs(at, timeZone) === asUtc);
  return new Date(exact.length > 0 ? Math.min(...exact) : Math.max(...candidates)).toISOString();
}

/** What the clocks of a time zone show at a moment, for a `datetime-local` field: "2026-03-02T09:20". */
export function wallTimeOf(at: string | number, timeZone: string): string {
  const moment = new Date(at).getTime();
  return new Date(moment + offsetMs(moment, timeZone)).toISOString().slice(0, 16);
}

/** How far the clocks of a time zone are ahead of UTC at a moment, ms. */
function offsetMs(moment: number, timeZone: string): number {
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    hourCycle: 'h23',
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    second: '2-digit',
  }).formatToParts(moment);
  const part = (type: string): number => Number(parts.find((one) => one.type === type)?.value);
  const shown = Date.UTC(part('year'), part('month') - 1, part('day'), part('hour'), part('minute'), part('second'));
  return shown - Math.floor(moment / 1000) * 1000;
}
