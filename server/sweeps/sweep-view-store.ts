import type { Detector, Line, SweepKind } from '@shared/detectors/detectors';
import { and, desc, eq, inArray, lt, sql } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { prepared } from '../db/prepared';
import {
  benches,
  builds,
  firmwareRevisions,
  frequencyGrids,
  hardwareRevisions,
  operatingStates,
  products,
  sweeps,
  teams,
  units,
} from '../db/schema';

/** What is asked for; what is left out is not filtered. */
export interface SweepFilter {
  teamIds?: readonly number[];
  productId?: number;
  ids?: readonly number[];
  buildId?: number;
  state?: string;
  bench?: string;
  line?: Line;
  detector?: Detector;
  kind?: SweepKind;
  before?: number;
}

function sweepRows(db: Database) {
  return db
    .select({
      sweep: sweeps,
      product: products,
      team: { key: teams.key },
      build: { position: builds.position },
      hardware: hardwareRevisions.name,
      firmware: firmwareRevisions.name,
      unit: units.serial,
      state: operatingStates.name,
      bench: benches.key,
      grid: {
        pointCount: frequencyGrids.pointCount,
        startHz: frequencyGrids.startHz,
        stopHz: frequencyGrids.stopHz,
        medianStepHz: frequencyGrids.medianStepHz,
      },
    })
    .from(sweeps)
    .innerJoin(products, eq(products.id, sweeps.productId))
    .innerJoin(teams, eq(teams.id, sweeps.teamId))
    .innerJoin(builds, eq(builds.id, sweeps.buildId))
    .innerJoin(hardwareRevisions, eq(hardwareRevisions.id, builds.hardwareId))
    .innerJoin(firmwareRevisions, eq(firmwareRevisions.id, builds.firmwareId))
    .innerJoin(operatingStates, eq(operatingStates.id, sweeps.stateId))
    .innerJoin(benches, eq(benches.id, sweeps.benchId))
    .innerJoin(frequencyGrids, eq(frequencyGrids.id, sweeps.gridId))
    .leftJoin(units, eq(units.id, sweeps.unitId));
}

/** A sweep with the names of everything it belongs to. */
export type SweepRow = ReturnType<ReturnType<typeof sweepRows>['all']>[number];

const rowById = prepared((db) =>
  sweepRows(db)
    .where(eq(sweeps.id, sql.placeholder('id')))
    .prepare(),
);

export function findSweepRow(db: Database, id: number): SweepRow | undefined {
  return rowById(db).get({ id });
}

/** Sweeps that pass the filter, newest import first. */
export function listSweepRows(db: Database, filter: SweepFilter, most: number): SweepRow[] {
  return sweepRows(db).where(passes(filter)).orderBy(desc(sweeps.id)).limit(most).all();
}

/** The last sweep a person brought into a team. */
export function findLastSweepRow(db: Database, teamId: number, personId: number): SweepRow | undefined {
  return sweepRows(db)
    .where(and(eq(sweeps.teamId, teamId), eq(sweeps.importedByKind, 'person'), eq(sweeps.importedById, personId)))
    .orderBy(desc(sweeps.importedAt), desc(sweeps.id))
    .limit(1)
    .get();
}

function passes(filter: SweepFilter) {
  return and(
    filter.teamIds && inArray(sweeps.teamId, [...filter.teamIds]),
    filter.productId === undefined ? undefined : eq(sweeps.productId, filter.productId),
    filter.ids && inArray(sweeps.id, [...filter.ids]),
    filter.buildId === undefined ? undefined : eq(sweeps.buildId, filter.buildId),
    filter.state === undefined ? undefined : eq(operatingStates.name, filter.state),
    filter.bench === undefined ? undefined : eq(benches.key, filter.bench),
    filter.line && eq(sweeps.line, filter.line),
    filter.detector && eq(sweeps.detector, filter.detector),
    filter.kind && eq(sweeps.kind, filter.kind),
    filter.before === undefined ? undefined : lt(sweeps.id, filter.before),
  );
}
