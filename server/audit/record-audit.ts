import { type Actor, actorColumns } from '../actor';
import type { Context } from '../context';
import { insertAuditEntry } from './audit-store';

export interface Audited {
  /** Null for the installation. */
  teamId: number | null;
  /** `<subject>.<verb in past tense>`, such as `drop.moved`. */
  action: string;
  subjectKind: string;
  subjectId: string | number;
  /** One sentence for a reader. */
  summary: string;
  /** Old and new values; never a secret. */
  details?: Record<string, unknown>;
}

/** Writes an audit entry; call it in the transaction of the change it tells of. */
export function recordAudit(context: Context, actor: Actor, audited: Audited): void {
  insertAuditEntry(context.db, {
    ...audited,
    ...actorColumns(actor),
    subjectId: String(audited.subjectId),
    at: context.now(),
  });
}
