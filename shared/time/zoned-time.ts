/**
 * The moment at which the clocks of a time zone show a wall time. Where clocks are set, an hour that is skipped counts on from
 * before the change, and of an hour that comes twice the second is meant.
 *
 * @param wallTime as a `datetime-local` field gives it, "2026-03-02T09:20"
 * @param timeZone IANA name
 * @returns ISO 8601 in UTC; undefined for a text that is no wall time
 */
export function momentOf(wallTime: string, timeZone: string): string | undefined {
  const asUtc = Date.parse(`${wallTime}Z`);
  if (Number.isNaN(asUtc)) return undefined;
  // The offset at the moment may differ from the one at the first guess, next to a change of clocks.
  const guess = asUtc - offsetMs(asUtc, timeZone);
  return new Date(asUtc - offsetMs(guess, timeZone)).toISOString();
}

/** What the clocks of a time zone show at a moment, for a `datetime-local` field. */
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
