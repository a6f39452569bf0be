import { and, eq, max } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { firmwareRevisions, hardwareRevisions } from '../db/schema';

export type HardwareRevision = typeof hardwareRevisions.$inferSelect;
export type FirmwareRevision = typeof firmwareRevisions.$inferSelect;

const TABLES = { hardware: hardwareRevisions, firmware: firmwareRevisions };

/** Row id of the revision with this name, made as the newest if there is none. */
export function findOrInsertRevision(
  db: Database,
  kind: keyof typeof TABLES,
  productId: number,
  name: string,
  createdAt: number,
): number {
  const table = TABLES[kind];
  const isNamed = and(eq(table.productId, productId), eq(table.name, name));
  const found = db.select({ id: table.id }).from(table).where(isNamed).get();
  if (found) return found.id;
  const last = db
    .select({ position: max(table.position) })
    .from(table)
    .where(eq(table.productId, productId))
    .get();
  const position = (last?.position ?? 0) + 1;
  const stored = db.insert(table).values({ productId, name, position, createdAt }).returning({ id: table.id }).get();
  return stored.id;
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
