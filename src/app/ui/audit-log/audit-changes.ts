/** One value that an audited change touched. */
export interface AuditChange {
  what: string;
  before: string;
  now: string;
}

/**
 * What an entry changed, value by value. Details hold `before` and `now`, each a value or an object of values; a side
 * that is not there is written as nothing. Values that stayed the same are left out.
 */
export function auditChanges({ before, now }: Record<string, unknown>): AuditChange[] {
  if (!isRecord(before) && !isRecord(now)) {
    return before === undefined && now === undefined ? [] : [{ what: 'value', before: text(before), now: text(now) }];
  }
  const sides = { before: isRecord(before) ? before : {}, now: isRecord(now) ? now : {} };
  // Where both sides are there, a value of the old one that the change did not name stayed as it was.
  const names = isRecord(now) ? Object.keys(now) : Object.keys(sides.before);
  return names
    .map((what) => ({ what, before: text(sides.before[what]), now: text(sides.now[what]) }))
    .filter((change) => change.before !== change.now);
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function text(value: unknown): string {
  if (value === undefined || value === null || value === '') return '';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string' || typeof value === 'number') return String(value);
  if (Array.isArray(value) && value.every((item) => typeof item === 'string')) return value.join(', ');
  return JSON.stringify(value);
}
