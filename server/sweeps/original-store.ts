import { eq } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { importItems, sweeps } from '../db/schema';

/** Whether a sweep or an item of a batch still needs the file. */
export function isOriginalNamed(db: Database, hash: string): boolean {
  const bySweep = db.select({ id: sweeps.id }).from(sweeps).where(eq(sweeps.originalSha256, hash)).limit(1).get();
  if (bySweep !== undefined) return true;
  const item = db.select({ id: importItems.id }).from(importItems).where(eq(importItems.originalSha256, hash));
  return item.limit(1).get() !== undefined;
}
