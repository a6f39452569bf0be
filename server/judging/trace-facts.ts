import { RECEIVER_BAND_B } from '@shared/detectors/receiver-bands';
import { firstIndexAbove, firstIndexAtOrAbove } from '@shared/traces/frequency-grid';
import { type BandMargin, sweepMargins } from '@shared/traces/margins';
import type { Context } from '../context';
import { bytesOf } from '../sweeps/measure-sweep';
import { sha256 } from '../sweeps/original-files';
import { knownGrid, plannedLine } from '../sweeps/prepared-grids';
import { readTrace } from '../sweeps/read-trace';
import { type BackgroundSweep, listBackgrounds } from './background-store';
import type { BuildRecord } from './build-record';
import type { ReadTraceFacts } from './gather-series';
import type { JudgedSweep } from './judged-sweep-store';

/** Sweeps no further apart belong to one day at the bench. */
const SAME_DAY_MS = 12 * 3600_000;

type Trace = ReturnType<typeof readTrace>;

/**
 * Prepares to tell, of single sweeps, the background of the day at their worst point and, for a PK sweep of the build,
 * its margin to the AV line. Traces are read only when asked for, each once.
 */
export function traceFacts(context: Context, record: BuildRecord): ReadTraceFacts {
  const backgrounds = backgroundsOf(context, [...record.sweeps, ...record.earlierSweeps]);
  const traces = new Map<number, Trace>();
  const traceOf = (sweepId: number): Trace => {
    const trace = traces.get(sweepId) ?? readTrace(context, sweepId);
    traces.set(sweepId, trace);
    return trace;
  };
  const averageBands = new Map<number, readonly BandMargin[]>();
  const averageBandsOf = (sweep: JudgedSweep): readonly BandMargin[] => {
    const bands = averageBands.get(sweep.id) ?? marginsToAverageLine(record, traceOf(sweep.id));
    averageBands.set(sweep.id, bands);
    return bands;
  };
  return (sweep, band, frequencyHz) => {
    const background = nearestBackground(backgrounds, sweep);
    const isOwnPeak = sweep.buildId === record.build.id && sweep.detector === 'PK';
    return {
      backgroundLevelDbuv: background ? levelAround(traceOf(background.id), frequencyHz) : null,
      averageLineMarginDb: isOwnPeak
        ? (averageBandsOf(sweep).find((one) => one.band === band)?.worst?.marginDb ?? null)
        : null,
    };
  };
}

function backgroundsOf(context: Context, sweeps: readonly JudgedSweep[]): BackgroundSweep[] {
  if (sweeps.length === 0) return [];
  const times = sweeps.map(({ takenAt }) => takenAt);
  const benchIds = [...new Set(sweeps.map(({ benchId }) => benchId))];
  return listBackgrounds(
    context.db,
    benchIds,
    times.reduce((a, b) => Math.min(a, b)) - SAME_DAY_MS,
    times.reduce((a, b) => Math.max(a, b)) + SAME_DAY_MS,
  );
}

/** The background nearest in time of the same bench, line, detector and correction, within the day. */
function nearestBackground(backgrounds: readonly BackgroundSweep[], sweep: JudgedSweep): BackgroundSweep | undefined {
  const apart = ({ takenAt }: BackgroundSweep) => Math.abs(takenAt - sweep.takenAt);
  return backgrounds
    .filter(
      (one) =>
        one.benchId === sweep.benchId &&
        one.line === sweep.line &&
        one.detector === sweep.detector &&
        one.correction === sweep.correction &&
        apart(one) <= SAME_DAY_MS,
    )
    .reduce<BackgroundSweep | undefined>(
      (nearest, one) => (nearest && apart(nearest) <= apart(one) ? nearest : one),
      undefined,
    );
}

/** Highest level within a receiver bandwidth of the frequency; null where the trace has no point there. */
function levelAround({ frequenciesHz, levelsDbuv }: Trace, frequencyHz: number): number | null {
  const from = firstIndexAtOrAbove(frequenciesHz, frequencyHz - RECEIVER_BAND_B.bandwidthHz);
  const to = firstIndexAbove(frequenciesHz, frequencyHz + RECEIVER_BAND_B.bandwidthHz);
  let highest: number | null = null;
  for (let i = from; i < to; i++) if (highest === null || levelsDbuv[i] > highest) highest = levelsDbuv[i];
  return highest;
}

function marginsToAverageLine(
  { product, team }: BuildRecord,
  { frequenciesHz, levelsDbuv }: Trace,
): readonly BandMargin[] {
  const planned = plannedLine(product.limitSetKey, 'AV');
  return sweepMargins(levelsDbuv, knownGrid(sha256(bytesOf(frequenciesHz)), frequenciesHz, planned, team.bands)).bands;
}
