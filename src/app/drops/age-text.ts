const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;
const DAY_MS = 24 * HOUR_MS;

/** How long ago, in the largest whole unit: "now", "5 min", "3 h", "12 d"; from eight weeks on in weeks. */
export function ageText(at: string, nowMs: number): string {
  const ageMs = Math.max(0, nowMs - Date.parse(at));
  if (ageMs < MINUTE_MS) return 'now';
  if (ageMs < HOUR_MS) return `${Math.floor(ageMs / MINUTE_MS)} min`;
  if (ageMs < DAY_MS) return `${Math.floor(ageMs / HOUR_MS)} h`;
  const days = Math.floor(ageMs / DAY_MS);
  return days < 56 ? `${days} d` : `${Math.floor(days / 7)} wk`;
}
