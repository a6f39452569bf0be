import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { isoTime } from '../iso-time';
import { markStale } from '../judging/mark-stale';
import { rollUpBuild } from '../margins/roll-up-build';
import type { SweepRow } from './find-sweep';
import { deleteSweep } from './sweep-store';

/**
 * Removes a sweep and everything computed from it. The evidence of a drop keeps its own copy; the original file stays
 * as long as another sweep or batch names it.
 */
export function removeSweep(context: Context, actor: Actor, row: SweepRow): void {
  const { sweep, product, build, hardware, firmware, state } = row;
  withTransaction(context.db, () => {
    deleteSweep(context.db, sweep.id);
    rollUpBuild(context, sweep.buildId);
    markStale(context, product.id, build.position + 1);
    recordAudit(context, actor, {
      teamId: sweep.teamId,
      action: 'sweep.removed',
      subjectKind: 'sweep',
      subjectId: sweep.id,
      summary: `Sweep ${sweep.id} of ${product.key} ${hardware} / ${firmware} (${state}, ${sweep.line} ${sweep.detector}) was removed`,
      details: {
        fileName: sweep.fileName,
        originalSha256: sweep.originalSha256,
        takenAt: isoTime(sweep.takenAt),
        kind: sweep.kind,
        worstMarginDb: sweep.worstMarginDb,
      },
    });
  });
}
