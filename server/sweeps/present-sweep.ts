import type { MarginPointView, SweepView, TraceView } from '@shared/contracts/sweeps';
import { limitAt } from '@shared/limits/limit-line';
import type { MarginPoint } from '@shared/traces/margins';
import type * as z from 'zod';
import { isoTime } from '../iso-time';
import type { SweepRow } from './find-sweep';
import { plannedLine } from './prepared-grids';
import type { SweepTrace } from './read-trace';

export function presentSweep(row: SweepRow): SweepView {
  const { sweep, product, team, grid, hardware, firmware, unit, state, bench } = row;
  const { id, buildId, line, detector, kind, run, rbwHz, attenuationDb, correction, fileName, limitSetKey } = sweep;
  return {
    id,
    product: product.key,
    productName: product.name,
    team: team.key,
    buildId,
    hardware,
    firmware,
    unit,
    state,
    bench,
    line,
    detector,
    kind,
    takenAt: isoTime(sweep.takenAt),
    run,
    rbwHz,
    attenuationDb,
    correction,
    ...grid,
    fileName,
    trace: sweep.traceNumber,
    limitSetKey,
    worst: presentWorst(row),
    bands: sweep.bands.map(({ band, worst, coveredFraction }) => ({
      band,
      worst: worst && presentPoint(worst),
      coveredFraction,
    })),
    remarks: sweep.remarks,
    importedAt: isoTime(sweep.importedAt),
    importedBy: sweep.importedByName,
  };
}

export function presentWorst({ sweep }: SweepRow): MarginPointView | null {
  const { worstMarginDb, worstFrequencyHz, worstLevelDbuv, worstLimitDbuv } = sweep;
  if (worstMarginDb === null || worstFrequencyHz === null || worstLevelDbuv === null || worstLimitDbuv === null) {
    return null;
  }
  return {
    marginDb: worstMarginDb,
    frequencyHz: worstFrequencyHz,
    levelDbuv: worstLevelDbuv,
    limitDbuv: worstLimitDbuv,
  };
}

function presentPoint({ marginDb, frequencyHz, levelDbuv, limitDbuv }: MarginPoint): MarginPointView {
  return { marginDb, frequencyHz, levelDbuv, limitDbuv };
}

export function presentTrace(
  { sweep }: SweepRow,
  { frequenciesHz, levelsDbuv }: SweepTrace,
): z.infer<typeof TraceView> {
  const { line } = plannedLine(sweep.limitSetKey, sweep.detector);
  return {
    id: sweep.id,
    frequenciesHz: Array.from(frequenciesHz),
    levelsDbuv: Array.from(levelsDbuv, asWritten),
    limitsDbuv: Array.from(frequenciesHz, (frequencyHz) => limitAt(line, frequencyHz)),
  };
}

/** A 32-bit level as the file wrote it: 45.27, not the 45.27000045776367 of a 64-bit reader. */
function asWritten(levelDbuv: number): number {
  const hundredths = Math.round(levelDbuv * 100) / 100;
  return Math.fround(hundredths) === levelDbuv ? hundredths : levelDbuv;
}
