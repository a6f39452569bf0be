import type { Context } from '../context';
import { unpackTrace } from './pack-trace';
import { gridFrequencies, listTraces } from './trace-store';

export interface SweepTrace {
  gridId: number;
  /** The same array for every trace on the grid. */
  frequenciesHz: Float64Array;
  levelsDbuv: Float32Array;
}

/** Levels of sweeps over frequency, in the order asked for, each grid read once. The sweeps must exist. */
export function readTraces(context: Context, sweepIds: readonly number[]): SweepTrace[] {
  const stored = new Map(listTraces(context.db, sweepIds).map((trace) => [trace.sweepId, trace]));
  const grids = new Map<number, Float64Array>();
  return sweepIds.map((sweepId) => {
    const trace = stored.get(sweepId);
    if (trace === undefined) throw new Error(`the trace of sweep ${sweepId} is gone`);
    const { gridId } = trace;
    const frequenciesHz = grids.get(gridId) ?? readGrid(context, gridId);
    grids.set(gridId, frequenciesHz);
    return { gridId, frequenciesHz, levelsDbuv: unpackTrace(trace) };
  });
}

/** Levels of one sweep over frequency. The sweep must exist. */
export function readTrace(context: Context, sweepId: number): SweepTrace {
  const [trace] = readTraces(context, [sweepId]);
  if (trace === undefined) throw new Error(`the trace of sweep ${sweepId} is gone`);
  return trace;
}

function readGrid(context: Context, gridId: number): Float64Array {
  const bytes = gridFrequencies(context.db, gridId);
  if (bytes === undefined) throw new Error(`the frequency grid ${gridId} is gone`);
  // A copy starts where eight-byte numbers may; the database's buffer need not.
  return new Float64Array(Uint8Array.from(bytes).buffer);
}
