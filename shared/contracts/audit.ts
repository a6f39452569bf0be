import * as z from 'zod';

/** GET /api/teams/:team/audit?before=<id>&limit=100 (leads), GET /api/installation/audit (administrators) */
export const AuditEntryView = z.object({
  id: z.int(),
  at: z.string(),
  actor: z.string(),
  actorKind: z.enum(['person', 'token', 'job']),
  action: z.string(),
  subjectKind: z.string(),
  subjectId: z.string(),
  summary: z.string(),
  details: z.record(z.string(), z.unknown()),
});
export type AuditEntryView = z.infer<typeof AuditEntryView>;
export const AuditPage = z.object({ entries: z.array(AuditEntryView), nextBefore: z.int().nullable() });
export type AuditPage = z.infer<typeof AuditPage>;
export const AuditQuery = z.object({
  before: z.coerce.number().int().positive().optional().describe('`nextBefore` of the page before'),
  limit: z.coerce.number().int().min(1).max(500).default(100),
});
