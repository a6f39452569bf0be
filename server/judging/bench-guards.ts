import { groupBy } from '@shared/collections/group-by';
import type { Detector } from '@shared/detectors/detectors';
import { detectorOrderHit, detectorOrderViolations } from '@shared/judging/detector-order';
import { constantOffsetHit, findConstantOffset } from '@shared/judging/find-constant-offset';
import type { GuardHit } from '@shared/judging/guard-hit';
import { cellEdgesHz } from '@shared/limits/cells';
import { limitAt } from '@shared/limits/limit-line';
import { meanCells } from '@shared/traces/mean-cells';
import type { GatheredBand, GatheredSeries } from './gather-series';
import type { JudgedSweep } from './judged-sweep-store';
import { runKey } from './run-margin-of';
import { type SeriesPlan, seriesPlan } from './series-plan';

/** Tells, of a band of a series, what the sweeps of the two sides say about the bench. */
export type ReadBenchHits = (series: GatheredSeries, band: GatheredBand) => GuardHit[];

/** Prepares to tell whether a whole curve moved, or detectors are out of order. */
export function benchHits(limitSetKey: string, buildSweeps: readonly JudgedSweep[]): ReadBenchHits {
  const orderHits = detectorOrderHits(limitSetKey, buildSweeps);
  return (series, band) => [
    ...constantOffsetHits(band.buildSweeps, band.referenceSweeps),
    ...(orderHits.get(channelKey(series))?.get(series.detector) ?? []),
  ];
}

function constantOffsetHits(build: readonly JudgedSweep[], reference: readonly JudgedSweep[]): GuardHit[] {
  if (build.length === 0 || reference.length === 0) return [];
  const offset = findConstantOffset(meanCells(build.map(cellsOf)), meanCells(reference.map(cellsOf)));
  return offset ? [constantOffsetHit(offset)] : [];
}

/** Hits by state and line, then by detector: both detectors of a pair out of order are under suspicion. */
function detectorOrderHits(
  limitSetKey: string,
  sweeps: readonly JudgedSweep[],
): Map<string, Map<Detector, readonly GuardHit[]>> {
  const centres = cellCentresHz();
  const byChannel = groupBy(sweeps, channelKey);
  return new Map(
    [...byChannel].map(([key, channel]) => {
      const hits = [...groupBy(channel, runKey).values()].flatMap((run) => hitsOfRun(limitSetKey, run, centres));
      return [key, firstHits(hits)];
    }),
  );
}

interface DetectorHit {
  readonly detectors: readonly Detector[];
  readonly hit: GuardHit;
}

function hitsOfRun(limitSetKey: string, run: readonly JudgedSweep[], centresHz: Float64Array): DetectorHit[] {
  const detectors = [...groupBy(run, ({ detector }) => detector)].map(([detector, sweeps]) => ({
    detector,
    cells: meanCells(sweeps.map(cellsOf)),
    limitsDbuv: limitsAt(seriesPlan(limitSetKey, detector, []), centresHz),
  }));
  return detectorOrderViolations(detectors).flatMap((violation) => {
    const hit = detectorOrderHit(violation);
    return hit ? [{ detectors: [violation.higher, violation.lower], hit }] : [];
  });
}

/** One hit a detector is enough; further runs repeat it. */
function firstHits(found: readonly DetectorHit[]): Map<Detector, readonly GuardHit[]> {
  const hits = new Map<Detector, readonly GuardHit[]>();
  for (const { detectors, hit } of found) {
    for (const detector of detectors) if (!hits.has(detector)) hits.set(detector, [hit]);
  }
  return hits;
}

function channelKey({ stateId, line }: { stateId: number; line: string }): string {
  return `${stateId} ${line}`;
}

/** Cells as stored: Int16 little-endian, copied since a blob may start at an odd address. */
function cellsOf({ cells }: JudgedSweep): Int16Array {
  return new Int16Array(new Uint8Array(cells).buffer);
}

function cellCentresHz(): Float64Array {
  const edges = cellEdgesHz();
  return edges.slice(1).map((toHz, cell) => Math.sqrt(edges[cell] * toHz));
}

function limitsAt({ line }: SeriesPlan, centresHz: Float64Array): Float64Array {
  return centresHz.map((frequencyHz) => limitAt(line, frequencyHz) ?? NaN);
}
