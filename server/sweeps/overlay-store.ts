import type { Detector, Line } from '@shared/detectors/detectors';
import { and, asc, between, eq, inArray } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { builds, operatingStates, sweeps } from '../db/schema';

/** What it takes to pick from many sweeps without reading them. */
export interface OverlayCandidate {
  id: number;
  buildId: number;
  stateId: number;
  line: Line;
  detector: Detector;
  run: string;
  takenAt: number;
  worstMarginDb: number | null;
}

export interface SeriesFilter {
  state?: string;
  line?: Line;
  detector?: Detector;
}

/** Product sweeps of the builds, by the place of the build and then series by series. */
export function listCandidates(
  db: Database,
  productId: number,
  buildIds: readonly number[],
  { state, line, detector }: SeriesFilter,
): OverlayCandidate[] {
  return db
    .select({
      id: sweeps.id,
      buildId: sweeps.buildId,
      stateId: sweeps.stateId,
      line: sweeps.line,
      detector: sweeps.detector,
      run: sweeps.run,
      takenAt: sweeps.takenAt,
      worstMarginDb: sweeps.worstMarginDb,
    })
    .from(sweeps)
    .innerJoin(builds, eq(builds.id, sweeps.buildId))
    .innerJoin(operatingStates, eq(operatingStates.id, sweeps.stateId))
    .where(
      and(
        eq(sweeps.productId, productId),
        inArray(sweeps.buildId, [...buildIds]),
        eq(sweeps.kind, 'product'),
        state === undefined ? undefined : eq(operatingStates.name, state),
        line && eq(sweeps.line, line),
        detector && eq(sweeps.detector, detector),
      ),
    )
    .orderBy(asc(builds.position), asc(operatingStates.position), asc(sweeps.line), asc(sweeps.detector))
    .all();
}

/** Background sweeps like the given one: same bench, line, detector and correction, taken between two moments. */
export function listBackgroundsLike(
  db: Database,
  like: Pick<typeof sweeps.$inferSelect, 'benchId' | 'line' | 'detector' | 'correction'>,
  fromAt: number,
  toAt: number,
  productId: number | undefined,
): { id: number; takenAt: number }[] {
  return db
    .select({ id: sweeps.id, takenAt: sweeps.takenAt })
    .from(sweeps)
    .where(
      and(
        eq(sweeps.benchId, like.benchId),
        between(sweeps.takenAt, fromAt, toAt),
        eq(sweeps.kind, 'background'),
        eq(sweeps.line, like.line),
        eq(sweeps.detector, like.detector),
        eq(sweeps.correction, like.correction),
        productId === undefined ? undefined : eq(sweeps.productId, productId),
      ),
    )
    .all();
}
