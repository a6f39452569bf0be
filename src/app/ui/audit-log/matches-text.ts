import type { AuditEntryView } from '@shared/contracts/audit';

/** Whether an entry holds every word of the text, wherever: who, what, action or values. */
export function matchesText(entry: AuditEntryView, text: string): boolean {
  const words = text.toLowerCase().split(/\s+/).filter(Boolean);
  if (words.length === 0) return true;
  const { actor, action, subjectKind, summary, details } = entry;
  const content = [actor, action, subjectKind, summary, JSON.stringify(details)].join(' ').toLowerCase();
  return words.every((word) => content.includes(word));
}
