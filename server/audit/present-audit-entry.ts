import type { AuditEntryView } from '@shared/contracts/audit';
import { isoTime } from '../iso-time';
import type { AuditEntry } from './audit-store';

export function presentAuditEntry(entry: AuditEntry): AuditEntryView {
  const { id, at, actorName, actorKind, action, subjectKind, subjectId, summary, details } = entry;
  return { id, at: isoTime(at), actor: actorName, actorKind, action, subjectKind, subjectId, summary, details };
}
