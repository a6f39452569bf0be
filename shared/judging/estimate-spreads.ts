import { effectiveDegrees } from '@shared/statistics/effective-degrees';
import { priorDegrees } from '@shared/statistics/prior-degrees';
import { shrinkSpread, type Spread } from '@shared/statistics/shrink-spread';
import { mean, sum } from 'simple-statistics';
import type { BandInput } from './build-input';
import type { JudgedSpread } from './band-judgement';
import { refuseRun } from './refuse-run';
import type { RunMargin } from './run-margin';
import { gatherRuns } from './side';

/** s_I before a bench has figures of its own: re-cabled in the same laboratory, 0.5 to 1 dB (common practice, no source). */
export const PLANNING_SPREAD: Spread = { sd: 0.7, degreesOfFreedom: 4 };
/** From here on a spread is called the bench's own: the planning value weighs less than a sixth. */
const OWN_FROM_DEGREES = 20;

/** A band with the limit line of its series. */
export interface BandOfSeries {
  readonly band: BandInput;
  readonly limitLineKey: string;
}

interface BandResiduals {
  /** Deviation of each run from the mean of its group, by run. */
  readonly byRun: ReadonlyMap<string, number>;
  readonly degreesOfFreedom: number;
}

/** Runs between which nothing changed: those since the last judged change, those of a chosen reference, those of the build; a bench apart. */
function groupsOfEqualTruth({ band, limitLineKey }: BandOfSeries): RunMargin[][] {
  const historyIds = new Set(band.history.map(({ sweepId }) => sweepId));
  const chosen = band.reference.filter(({ sweepId }) => !historyIds.has(sweepId));
  const groups: RunMargin[][] = [];
  for (const sweeps of [band.history, chosen, band.build]) {
    const sound = sweeps.filter((sweep) => refuseRun(sweep, limitLineKey) === null);
    for (const set of new Set(sound.map(setUp))) groups.push(sound.filter((sweep) => setUp(sweep) === set));
  }
  return groups;
}

function setUp({ bench, correction }: RunMargin): string {
  return JSON.stringify([bench, correction]);
}

function residualsOf(band: BandOfSeries): BandResiduals {
  const byRun = new Map<string, number>();
  let degreesOfFreedom = 0;
  for (const group of groupsOfEqualTruth(band)) {
    const runs = gatherRuns(group).map((sweeps) => ({
      key: JSON.stringify([sweeps[0].buildId, sweeps[0].run]),
      marginDb: mean(sweeps.map(({ marginDb }) => marginDb)),
    }));
    const centreDb = mean(runs.map(({ marginDb }) => marginDb));
    for (const { key, marginDb } of runs) if (runs.length > 1) byRun.set(key, marginDb - centreDb);
    degreesOfFreedom += runs.length - 1;
  }
  return { byRun, degreesOfFreedom };
}

function ownSpread({ byRun, degreesOfFreedom }: BandResiduals): Spread {
  const squares = sum([...byRun.values()].map((residualDb) => residualDb ** 2));
  return { sd: degreesOfFreedom > 0 ? Math.sqrt(squares / degreesOfFreedom) : 0, degreesOfFreedom };
}

/** Spread of all bands together; bands of one session move together, so its degrees of freedom are fewer than their sum. */
function commonSpread(residuals: readonly BandResiduals[]): Spread {
  const total = sum(residuals.map(({ degreesOfFreedom }) => degreesOfFreedom));
  if (total === 0) return { sd: 0, degreesOfFreedom: 0 };
  const squares = sum(residuals.flatMap(({ byRun }) => [...byRun.values()].map((residualDb) => residualDb ** 2)));
  const runs = [...new Set(residuals.flatMap(({ byRun }) => [...byRun.keys()]))];
  const rows = runs.map((run) => residuals.map(({ byRun }) => byRun.get(run) ?? 0));
  const perBand = Math.max(...residuals.map(({ degreesOfFreedom }) => degreesOfFreedom));
  return { sd: Math.sqrt(squares / total), degreesOfFreedom: effectiveDegrees(rows, perBand) };
}

function describe(spread: Spread, measured: number): JudgedSpread {
  const sdDb = spread.sd;
  const { degreesOfFreedom } = spread;
  if (measured === 0) {
    return { sdDb, degreesOfFreedom, source: 'planning', text: "planning value, not yet this bench's own" };
  }
  const source = measured >= OWN_FROM_DEGREES ? 'own' : 'mixed';
  const basis = `runs between which nothing changed (${measured.toFixed(0)} degrees of freedom)`;
  const text = source === 'own' ? `from ${basis}` : `from ${basis}, drawn toward the planning value of 0.7 dB`;
  return { sdDb, degreesOfFreedom, source, text };
}

/**
 * Estimates the spread s_I each band is judged with.
 *
 * Per band: runs between which nothing changed, pooled after ISO 5725-2. All bands together: the same, with the degrees of
 * freedom that bands moving together have, drawn toward the planning value. Each band is then drawn toward that common
 * spread as strongly as the bands are alike. A repeat study given with the band joins the band's own runs.
 *
 * @param bands all bands of a build
 * @returns spreads in dB, in the order given
 * Source: Smyth 2004 (moderated t: prior variance and its weight estimated from the ensemble), ISO 5725-2, and
 *   judging by our own planning value where nothing is measured.
 */
export function estimateSpreads(bands: readonly BandOfSeries[]): JudgedSpread[] {
  const residuals = bands.map(residualsOf);
  const common = commonSpread(residuals);
  const prior = shrinkSpread(common, PLANNING_SPREAD);
  const own = residuals.map(ownSpread);
  const weight = Math.min(prior.degreesOfFreedom, priorDegrees(own));
  return bands.map(({ band }, index) => {
    const study = band.spread
      ? { sd: band.spread.sdDb, degreesOfFreedom: band.spread.degreesOfFreedom }
      : { sd: 0, degreesOfFreedom: 0 };
    // Bands that look alike share one spread, which already holds the band's own runs.
    if (weight === prior.degreesOfFreedom) {
      return describe(shrinkSpread(study, prior), common.degreesOfFreedom + study.degreesOfFreedom);
    }
    const drawn = shrinkSpread(own[index], { sd: prior.sd, degreesOfFreedom: weight });
    return describe(shrinkSpread(study, drawn), own[index].degreesOfFreedom + study.degreesOfFreedom);
  });
}
