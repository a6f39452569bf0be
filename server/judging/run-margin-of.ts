import type { RunMargin } from '@shared/judging/run-margin';
import type { BandMargin } from '@shared/traces/margins';
import type { JudgedSweep } from './judged-sweep-store';
import { limitLineKey } from './series-plan';

/** What only the trace can tell, of sweeps that are looked at closely. */
export interface TraceFacts {
  readonly backgroundLevelDbuv: number | null;
  readonly averageLineMarginDb: number | null;
}

const UNKNOWN: TraceFacts = { backgroundLevelDbuv: null, averageLineMarginDb: null };

/** The sweep's worst point in the band with its set-up; undefined when the sweep has no point there. */
export function runMarginOf(sweep: JudgedSweep, band: string, facts: TraceFacts = UNKNOWN): RunMargin | undefined {
  const margin = bandMarginOf(sweep, band);
  if (!margin?.worst) return undefined;
  const { marginDb, frequencyHz, levelDbuv, limitDbuv } = margin.worst;
  const { floorMarginDb, coveredFraction } = margin;
  const { buildId, unit, bench, takenAt, rbwHz, stepHz, attenuationDb, correction, gridId, readingHash } = sweep;
  return {
    sweepId: sweep.id,
    buildId,
    run: runKey(sweep),
    unit,
    bench,
    takenAt,
    limitLineKey: limitLineKey(sweep.limitSetKey, sweep.limitSetVersion, sweep.detector),
    rbwHz,
    stepHz,
    attenuationDb,
    correction,
    gridId,
    readingHash,
    marginDb,
    frequencyHz,
    levelDbuv,
    limitDbuv,
    floorMarginDb,
    coveredFraction,
    ...facts,
  };
}

export function bandMarginOf(sweep: JudgedSweep, band: string): BandMargin | undefined {
  return sweep.bands.find((one) => one.band === band);
}

/** One unit on one bench in one session is a run; the session's name alone may come again on another bench or unit. */
export function runKey({ run, bench, unit }: Pick<JudgedSweep, 'run' | 'bench' | 'unit'>): string {
  return JSON.stringify([run, bench, unit]);
}
