import type { AuditEntryView } from '@shared/contracts/audit';
import type { BuildSummary } from '@shared/contracts/builds';

export interface ReferenceChoiceLine {
  id: number;
  at: string;
  actor: string;
  /** What was compared with from then on. */
  what: string;
  reason: string;
}

/** The choices of a product's reference among lines of the audit log, as they come: newest first. */
export function referenceChoices(
  entries: readonly AuditEntryView[],
  builds: readonly Pick<BuildSummary, 'id' | 'hardware' | 'firmware'>[],
): ReferenceChoiceLine[] {
  const names = new Map<unknown, string>(builds.map(({ id, hardware, firmware }) => [id, `${hardware} / ${firmware}`]));
  return entries
    .filter(
      ({ action, details }) =>
        action === 'reference.chosen' && (names.has(details['now']) || names.has(details['before'])),
    )
    .map(({ id, at, actor, summary, details }) => {
      const what = names.get(details['now']);
      return { id, at, actor, what: what ?? 'builds judged held', reason: reasonIn(summary, what) };
    });
}

/** The log writes "Reference of <key> is <build>: <reason>". */
function reasonIn(summary: string, build: string | undefined): string {
  const start = build === undefined ? summary.indexOf(': ') : summary.indexOf(` is ${build}: `) + ` is ${build}`.length;
  return start < 0 ? summary : summary.slice(start + 2);
}
