import { and, eq, max } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { firmwareRevisions, hardwareRevisions } from '../db/schema';

export type HardwareRevision = typeof hardwareRevisions.$inferSelect;
export type FirmwareRevision = typeof firmwareRevisions.$inferSelect;

/** The revision with this name, made as the newest if there is none. */
export function findOrInsertHardware(
  db: Database,
  productId: number,
  name: string,
  createdAt: number,
): HardwareRevision {
  const found = db
    .select()
    .from(hardwareRevisions)
    .where(and(eq(hardwareRevisions.productId, productId), eq(hardwareRevisions.name, name)))
    .get();
  if (found) return found;
  const last = db
    .select({ position: max(hardwareRevisions.position) })
    .from(hardwareRevisions)
    .where(eq(hardwareRevisions.productId, productId))
    .get();
  const position = (last?.position ?? 0) + 1;
  return db.insert(hardwareRevisions).values({ productId, name, position, createdAt }).returning().get();
}

/** The revision with this name, made as the newest if there is none. */
export function findOrInsertFirmware(
  db: Database,
  productId: number,
  name: string,
  createdAt: number,
): FirmwareRevision {
  const found = db
    .select()
    .from(firmwareRevisions)
    .where(and(eq(firmwareRevisions.productId, productId), eq(firmwareRevisions.name, name)))
    .get();
  if (found) return found;
  const last = db
    .select({ position: max(firmwareRevisions.position) })
    .from(firmwareRevisions)
    .where(eq(firmwareRevisions.productId, productId))
    .get();
  const position = (last?.position ?? 0) + 1;
  return db.insert(firmwareRevisions).values({ productId, name, position, createdAt }).returning().get();
}

export function findHardware(db: Database, id: number): HardwareRevision | undefined {
  return db.select().from(hardwareRevisions).where(eq(hardwareRevisions.id, id)).get();
}

export function findFirmware(db: Database, id: number): FirmwareRevision | undefined {
  return db.select().from(firmwareRevisions).where(eq(firmwareRevisions.id, id)).get();
}

export function updateHardware(db: Database, id: number, change: { notes?: string }): void {
  db.update(hardwareRevisions).set(change).where(eq(hardwareRevisions.id, id)).run();
}

export function updateFirmware(db: Database, id: number, change: { notes?: string; commit?: string }): void {
  db.update(firmwareRevisions).set(change).where(eq(firmwareRevisions.id, id)).run();
}
