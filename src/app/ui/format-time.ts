export type TimeDetail = 'day' | 'minute' | 'second';

/** Writes a time in a zone: "2 Mar 2026", "2 Mar 2026, 09:20" or "2 Mar 2026, 09:20:00". */
export function formatTime(at: string | number, timeZone: string, detail: TimeDetail = 'minute'): string {
  const timeStyle = { day: undefined, minute: 'short', second: 'medium' } as const;
  return new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: timeStyle[detail], timeZone }).format(
    new Date(at),
  );
}
