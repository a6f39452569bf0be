import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { benches, frequencyGrids, operatingStates, sweeps, units } from '../db/schema';

const COLUMNS = {
  id: sweeps.id,
  buildId: sweeps.buildId,
  stateId: sweeps.stateId,
  stateName: operatingStates.name,
  statePosition: operatingStates.position,
  unit: units.serial,
  benchId: sweeps.benchId,
  bench: benches.key,
  lisn: benches.lisn,
  receiver: benches.receiver,
  line: sweeps.line,
  detector: sweeps.detector,
  takenAt: sweeps.takenAt,
  run: sweeps.run,
  rbwHz: sweeps.rbwHz,
  attenuationDb: sweeps.attenuationDb,
  correction: sweeps.correction,
  gridId: sweeps.gridId,
  stepHz: frequencyGrids.medianStepHz,
  readingHash: sweeps.readingHash,
  limitSetKey: sweeps.limitSetKey,
  limitSetVersion: sweeps.limitSetVersion,
  bands: sweeps.bands,
  cells: sweeps.cells,
};

function selectSweeps(db: Database) {
  return db
    .select(COLUMNS)
    .from(sweeps)
    .innerJoin(operatingStates, eq(operatingStates.id, sweeps.stateId))
    .innerJoin(benches, eq(benches.id, sweeps.benchId))
    .innerJoin(frequencyGrids, eq(frequencyGrids.id, sweeps.gridId))
    .leftJoin(units, eq(units.id, sweeps.unitId));
}

/** A product sweep with its packed results; the trace itself stays where it is. */
export type JudgedSweep = ReturnType<ReturnType<typeof selectSweeps>['all']>[number];

/** Product sweeps of the builds in the states, oldest first. */
export function listJudgedSweeps(
  db: Database,
  buildIds: readonly number[],
  stateIds?: readonly number[],
): JudgedSweep[] {
  const inStates = stateIds && inArray(sweeps.stateId, [...stateIds]);
  return selectSweeps(db)
    .where(and(inArray(sweeps.buildId, [...buildIds]), eq(sweeps.kind, 'product'), inStates))
    .orderBy(asc(sweeps.takenAt), asc(sweeps.id))
    .all();
}

/** Builds the sweeps belong to, once each. */
export function listBuildIdsOfSweeps(db: Database, sweepIds: readonly number[]): number[] {
  return db
    .selectDistinct({ buildId: sweeps.buildId })
    .from(sweeps)
    .where(inArray(sweeps.id, [...sweepIds]))
    .all()
    .map(({ buildId }) => buildId);
}
