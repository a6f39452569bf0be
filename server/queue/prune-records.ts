import type { Context } from '../context';
import { deleteExpiredSessions } from '../http/session-store';
import { pruneMail } from '../mail/prune-mail';
import { pruneOriginals } from '../sweeps/prune-originals';
import type { HeldRun } from './held-run';
import { deleteEndedRuns } from './run-store';

/** Records of runs are kept this long. */
const KEEP_RUNS_MS = 90 * 24 * 3600_000;

export function pruneRecords(context: Context, held: HeldRun): void {
  const now = context.now();
  held.expect(4);
  deleteExpiredSessions(context.db, now);
  held.advance('sessions');
  deleteEndedRuns(context.db, now - KEEP_RUNS_MS);
  held.advance('runs');
  pruneOriginals(context);
  held.advance('originals');
  pruneMail(context);
  held.advance('mail');
}
