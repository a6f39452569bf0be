import { and, asc, eq, type SQL } from 'drizzle-orm';
import type { Detector, Line } from '@shared/detectors/detectors';
import type { Database } from '../db/open-database';
import { sweeps } from '../db/schema';

/**
 * Filter of one product's series; what is left out is not filtered. Without a detector, PK sweeps that a QP sweep
 * supersedes do not count.
 */
export interface SeriesChoice {
  stateId?: number;
  line?: Line;
  detector?: Detector;
}

/** The worst point of one product sweep. */
export interface TrendSweep {
  buildId: number;
  stateId: number;
  line: Line;
  detector: Detector;
  run: string;
  benchId: number;
  unitId: number | null;
  marginDb: number | null;
  frequencyHz: number | null;
}

const SERIES = {
  buildId: sweeps.buildId,
  stateId: sweeps.stateId,
  line: sweeps.line,
  detector: sweeps.detector,
  run: sweeps.run,
  benchId: sweeps.benchId,
  unitId: sweeps.unitId,
};

/** Worst points over the whole range, read from an index alone. */
export function listWorstPoints(db: Database, productId: number, choice: SeriesChoice): TrendSweep[] {
  return db
    .select({ ...SERIES, marginDb: sweeps.worstMarginDb, frequencyHz: sweeps.worstFrequencyHz })
    .from(sweeps)
    .where(chosen(productId, choice))
    .orderBy(asc(sweeps.buildId))
    .all();
}

/** Worst points in one band. */
export function listBandPoints(db: Database, productId: number, choice: SeriesChoice, band: string): TrendSweep[] {
  return db
    .select({ ...SERIES, bands: sweeps.bands })
    .from(sweeps)
    .where(chosen(productId, choice))
    .orderBy(asc(sweeps.buildId))
    .all()
    .map(({ bands, ...series }) => {
      const worst = bands.find((margin) => margin.band === band)?.worst;
      return { ...series, marginDb: worst?.marginDb ?? null, frequencyHz: worst?.frequencyHz ?? null };
    });
}

function chosen(productId: number, { stateId, line, detector }: SeriesChoice): SQL | undefined {
  return and(
    eq(sweeps.productId, productId),
    eq(sweeps.kind, 'product'),
    stateId === undefined ? undefined : eq(sweeps.stateId, stateId),
    line === undefined ? undefined : eq(sweeps.line, line),
    detector === undefined ? eq(sweeps.isSuperseded, false) : eq(sweeps.detector, detector),
  );
}
