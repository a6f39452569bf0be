import type { OverlayTrace } from '@shared/contracts/sweeps';
import type { Frames } from '@shared/traces/frames';
import type { Context } from '../context';
import { isoTime } from '../iso-time';
import type { SweepRow } from './find-sweep';
import { plannedLine } from './prepared-grids';
import { presentWorst } from './present-sweep';
import { readTraces } from './read-trace';

/** Sweeps as the frame that pages draw from, each grid once. */
export function frameSweeps(context: Context, rows: readonly SweepRow[]): Frames<OverlayTrace> {
  const traces = readTraces(
    context,
    rows.map(({ sweep }) => sweep.id),
  );
  const grids = [...new Set(traces.map(({ frequenciesHz }) => frequenciesHz))];
  return {
    grids,
    traces: rows.flatMap((row, index) => {
      const trace = traces[index];
      if (trace === undefined) return [];
      return { grid: grids.indexOf(trace.frequenciesHz), meta: describe(row), levelsDbuv: trace.levelsDbuv };
    }),
  };
}

function describe(row: SweepRow): OverlayTrace {
  const { sweep, hardware, firmware, state, bench } = row;
  const { buildId, line, detector, kind, run } = sweep;
  const planned = plannedLine(sweep.limitSetKey, detector);
  const subject = kind === 'product' ? `${hardware} / ${firmware}` : `${SUBJECTS[kind]} ${bench}`;
  return {
    sweepId: sweep.id,
    label: `${subject}, ${state}, ${line} ${detector}`,
    buildId,
    hardware,
    firmware,
    state,
    bench,
    line,
    detector,
    kind,
    run,
    takenAt: isoTime(sweep.takenAt),
    worst: presentWorst(row),
    limit: {
      detector: planned.line.detector,
      title: `${planned.set.title}, ${planned.line.detector}`,
      segments: [...planned.line.segments],
    },
  };
}

const SUBJECTS = { background: 'Background of', checkSource: 'Check source on' } as const;
