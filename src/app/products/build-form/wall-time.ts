/**
 * A moment as clocks show it in a zone, for a field of type datetime-local.
 * Example: 2026-11-26T05:00:00Z in Europe/Stockholm gives "2026-11-26T06:00".
 */
export function wallTimeOf(iso: string | number, timeZone: string): string {
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    hourCycle: 'h23',
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
  }).formatToParts(new Date(iso));
  const part = (type: string) => parts.find((one) => one.type === type)?.value ?? '';
  return `${part('year')}-${part('month')}-${part('day')}T${part('hour')}:${part('minute')}`;
}

/**
 * The moment when clocks in a zone show a time, as ISO 8601 in UTC. Where clocks go back the time comes twice and the
 * first is meant; where they go forward it does not come, and the moment as far after the change is taken.
 * Throws RangeError when the text is no wall time.
 */
export function isoOfWallTime(wallTime: string, timeZone: string): string {
  const asUtc = Date.parse(`${wallTime}Z`);
  if (Number.isNaN(asUtc)) throw new RangeError(`"${wallTime}" is no date and time`);
  const offsetAt = (at: number) => Date.parse(`${wallTimeOf(at, timeZone)}Z`) - floorToMinute(at);
  const dayMs = 24 * 3600_000;
  // The offsets of a day before and after are those on either side of a change of the clocks.
  const candidates = [offsetAt(asUtc - dayMs), offsetAt(asUtc + dayMs)].map((offset) => asUtc - offset);
  const exact = candidates.filter((at) => asUtc - offsetAt(at) === at);
  const at = exact.length > 0 ? Math.min(...exact) : Math.max(...candidates);
  return new Date(at).toISOString();
}

function floorToMinute(at: number): number {
  return Math.floor(at / 60_000) * 60_000;
}
