import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { isOriginalNamed } from './original-store';

/** An upload that is still under way names its files within this time. */
const YOUNG_MS = 24 * 3600_000;

/** Removes the instrument files that no sweep and no batch names: what failed imports and removed sweeps left behind. */
export function pruneOriginals(context: Context): number {
  const { db, originals } = context;
  const youngFrom = context.now() - YOUNG_MS;
  let removed = 0;
  for (const hash of originals.keptBefore(youngFrom)) {
    if (isOriginalNamed(db, hash)) continue;
    // The look and the removal are one transaction, so that no import names the file in between; an upload that has yet to
    // name it has made it young.
    withTransaction(db, () => {
      if (!isOriginalNamed(db, hash) && originals.removeKeptBefore(hash, youngFrom)) removed += 1;
    });
  }
  return removed;
}
