import type { Detector } from '@shared/detectors/detectors';
import { bandsFor, teamBand } from '@shared/limits/bands';
import { cellEdgesHz } from '@shared/limits/cells';
import type { LimitLine } from '@shared/limits/limit-line';
import type { LimitSet } from '@shared/limits/limit-set';
import { findLimitSet, lineForDetector } from '@shared/limits/limit-sets';
import { describeGrid, type GridDescription } from '@shared/traces/frequency-grid';
import { type PreparedGrid, prepareGrid } from '@shared/traces/margins';
import type { TeamBand } from '../db/schema/teams';
import { ServiceError } from '../service-error';

/** Most points of all kept grids together: 16 bytes each, and 300 grids of a 9 kHz receiver. */
const MOST_POINTS = 2_000_000;
const CELL_EDGES_HZ = cellEdgesHz();
const kept = new Map<string, KnownGrid>();

/** A grid made ready for margins, with what identifies it to people. */
export interface KnownGrid extends PreparedGrid {
  readonly description: GridDescription;
}

export interface PlannedLine {
  set: LimitSet;
  line: LimitLine;
}

/** The limit line for a detector. @throws ServiceError `conflict` when the product's plan has none */
export function plannedLine(limitSetKey: string, detector: Detector): PlannedLine {
  const set = findLimitSet(limitSetKey);
  const line = set && lineForDetector(set, detector);
  if (set === undefined || line === undefined) {
    throw new ServiceError(
      'conflict',
      `the product's limit plan "${limitSetKey}" has no line for detector ${detector}`,
    );
  }
  return { set, line };
}

/** The grid made ready for margins against a limit line; the least recently used are forgotten. */
export function knownGrid(
  gridHash: string,
  frequenciesHz: Float64Array,
  { set, line }: PlannedLine,
  teamBands: readonly TeamBand[],
): KnownGrid {
  const key = JSON.stringify([gridHash, set.key, set.version, line.detector, teamBands]);
  const found = kept.get(key);
  if (found !== undefined) {
    kept.delete(key);
    kept.set(key, found);
    return found;
  }
  const prepared = prepareGrid(frequenciesHz, line, bandsFor(line, teamBands.map(teamBand)), CELL_EDGES_HZ);
  const known = { ...prepared, description: describeGrid(frequenciesHz) };
  kept.set(key, known);
  forgetOldest();
  return known;
}

/** Forgets grids not used for longest until the rest is small enough; the newest stays whatever its size. */
function forgetOldest(): void {
  let points = [...kept.values()].reduce((sum, { description }) => sum + description.pointCount, 0);
  for (const [key, { description }] of kept) {
    if (points <= MOST_POINTS || kept.size === 1) return;
    kept.delete(key);
    points -= description.pointCount;
  }
}
