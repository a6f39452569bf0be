/** UTC milliseconds as ISO 8601, the form of every time in the interface. */
export function isoTime(at: number): string {
  return new Date(at).toISOString();
}

export function isoTimeOrNull(at: number | null): string | null {
  return at === null ? null : isoTime(at);
}
