import type { AuditPage } from '@shared/contracts/audit';
import type { Context } from '../context';
import { listAuditEntries } from './audit-store';
import { presentAuditEntry } from './present-audit-entry';

/** A page of the log of a team (null: of the installation), newest first. */
export function listAudit(
  context: Context,
  teamId: number | null,
  { before, limit }: { before?: number | undefined; limit: number },
): AuditPage {
  const entries = listAuditEntries(context.db, teamId, before ?? null, limit + 1);
  const shown = entries.slice(0, limit);
  const isMore = entries.length > limit;
  return { entries: shown.map(presentAuditEntry), nextBefore: (isMore ? shown.at(-1)?.id : null) ?? null };
}
