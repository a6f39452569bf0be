import { and, asc, eq, max, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { prepared } from '../db/prepared';
import { operatingStates, units } from '../db/schema';

export type OperatingState = typeof operatingStates.$inferSelect;
export type Unit = typeof units.$inferSelect;

/** States of a product in the team's order. */
export function listStates(db: Database, productId: number): OperatingState[] {
  return db
    .select()
    .from(operatingStates)
    .where(eq(operatingStates.productId, productId))
    .orderBy(asc(operatingStates.position))
    .all();
}

const stateByName = prepared((db) =>
  db
    .select()
    .from(operatingStates)
    .where(
      and(
        eq(operatingStates.productId, sql.placeholder('productId')),
        eq(operatingStates.name, sql.placeholder('name')),
      ),
    )
    .prepare(),
);

export function findStateByName(db: Database, productId: number, name: string): OperatingState | undefined {
  return stateByName(db).get({ productId, name });
}

export function insertState(
  db: Database,
  state: Omit<typeof operatingStates.$inferInsert, 'position'>,
): OperatingState {
  const last = db
    .select({ position: max(operatingStates.position) })
    .from(operatingStates)
    .where(eq(operatingStates.productId, state.productId))
    .get();
  const position = (last?.position ?? 0) + 1;
  return db
    .insert(operatingStates)
    .values({ ...state, position })
    .returning()
    .get();
}

export function updateState(
  db: Database,
  id: number,
  change: Partial<typeof operatingStates.$inferInsert>,
): OperatingState {
  return db.update(operatingStates).set(change).where(eq(operatingStates.id, id)).returning().get();
}

export function listUnits(db: Database, productId: number): Unit[] {
  return db.select().from(units).where(eq(units.productId, productId)).orderBy(asc(units.serial)).all();
}

const unitBySerial = prepared((db) =>
  db
    .select()
    .from(units)
    .where(and(eq(units.productId, sql.placeholder('productId')), eq(units.serial, sql.placeholder('serial'))))
    .prepare(),
);

/** The unit with this serial number, made if there is none. */
export function findOrInsertUnit(db: Database, productId: number, serial: string, createdAt: number): Unit {
  const found = unitBySerial(db).get({ productId, serial });
  return found ?? db.insert(units).values({ productId, serial, createdAt }).returning().get();
}
