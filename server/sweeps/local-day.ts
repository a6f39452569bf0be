const formats = new Map<string, Intl.DateTimeFormat>();

/** The date in a time zone, such as 2026-03-02. */
export function localDay(at: number, timeZone: string): string {
  let format = formats.get(timeZone);
  if (format === undefined) {
    // The Canadian form of a date is ISO 8601's; making a format costs far more than using it.
    format = new Intl.DateTimeFormat('en-CA', { timeZone, year: 'numeric', month: '2-digit', day: '2-digit' });
    formats.set(timeZone, format);
  }
  return format.format(at);
}
