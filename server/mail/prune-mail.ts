import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { emptyEndedMails } from './outbox-store';

/** Sent and given-up mail keeps its words and pictures this long; its record stays, so that nothing is written twice. */
const KEEP_WORDS_MS = 30 * 24 * 3600_000;

/** Empties old mail that is on its way no more. Returns how many. */
export function pruneMail(context: Context): number {
  return withTransaction(context.db, () => emptyEndedMails(context.db, context.now() - KEEP_WORDS_MS));
}
