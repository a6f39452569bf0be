import type { Line } from '@shared/detectors/detectors';
import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { operatingStates, sweeps } from '../db/schema';

/** Names of the states every build must be measured in. */
export function listRequiredStates(db: Database, productId: number): string[] {
  return db
    .select({ name: operatingStates.name })
    .from(operatingStates)
    .where(and(eq(operatingStates.productId, productId), eq(operatingStates.isRequired, true)))
    .orderBy(asc(operatingStates.position))
    .all()
    .map(({ name }) => name);
}

/** Lines on which the builds were measured. */
export function listMeasuredLines(db: Database, buildIds: readonly number[]): Line[] {
  return db
    .selectDistinct({ line: sweeps.line })
    .from(sweeps)
    .where(and(inArray(sweeps.buildId, [...buildIds]), eq(sweeps.kind, 'product')))
    .orderBy(asc(sweeps.line))
    .all()
    .map(({ line }) => line);
}
