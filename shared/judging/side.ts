import { mean } from 'simple-statistics';
import type { RunMargin } from './run-margin';

/** One side of a comparison, its sweeps gathered into runs. */
export interface Side {
  readonly sweeps: readonly RunMargin[];
  readonly runCount: number;
  readonly meanMarginDb: number;
  readonly meanLevelDbuv: number;
  readonly meanLimitDbuv: number;
  readonly worst: RunMargin;
}

/** Sweeps of one series taken in one run are one measurement: their margins are averaged and count once. */
export function gatherRuns(sweeps: readonly RunMargin[]): RunMargin[][] {
  const runs = new Map<string, RunMargin[]>();
  for (const sweep of sweeps) {
    const key = JSON.stringify([sweep.buildId, sweep.run]);
    const run = runs.get(key);
    if (run) run.push(sweep);
    else runs.set(key, [sweep]);
  }
  return [...runs.values()];
}

/**
 * Gathers the sweeps of one side into runs and averages over them, in dB.
 * @param sweeps of one series and band, at least one
 * @returns means over runs, and the sweep with the least margin
 * Throws RangeError without a sweep.
 * Source: mean in dB since margins are near normal in dB (practice of CISPR 16-4-2).
 * Example: runs a (2 dB and 4 dB) and b (5 dB) have the mean margin 4 dB and the worst 2 dB.
 */
export function summariseSide(sweeps: readonly RunMargin[]): Side {
  if (sweeps.length === 0) throw new RangeError('a side needs at least one sweep');
  const runs = gatherRuns(sweeps);
  const overRuns = (pick: (sweep: RunMargin) => number) => mean(runs.map((run) => mean(run.map(pick))));
  return {
    sweeps,
    runCount: runs.length,
    meanMarginDb: overRuns(({ marginDb }) => marginDb),
    meanLevelDbuv: overRuns(({ levelDbuv }) => levelDbuv),
    meanLimitDbuv: overRuns(({ limitDbuv }) => limitDbuv),
    worst: sweeps.reduce((worst, sweep) => (sweep.marginDb < worst.marginDb ? sweep : worst)),
  };
}
