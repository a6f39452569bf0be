import { groupBy } from '@shared/collections/group-by';
import { type Creep, findCreep } from '@shared/judging/find-creep';
import type { Context } from '../context';
import { type JudgedMargin, listJudgedMargins } from './digest-facts-store';

/** Builds whose mean is the reference of a series that nothing has changed yet. */
const REFERENCE_BUILDS = 5;

export interface CreepOfBand {
  state: string;
  band: string;
  marginDb: number;
  creep: Creep;
}

/**
 * Slow losses of a product that no single build shows: for every operating state and band the series with the least
 * margin now, since its last judged change. One series a band, so that the many that move together count once.
 */
export function listCreep(context: Context, productId: number, targetMarginDb: number): CreepOfBand[] {
  const places = groupBy(listJudgedMargins(context.db, productId), ({ stateId, band }) => `${stateId} ${band}`);
  return [...places.values()].flatMap((margins) => {
    const series = [...groupBy(margins, ({ line, detector }) => `${line} ${detector}`).values()].map(sinceLastChange);
    const [closest] = series.filter(isLongEnough).sort((one, other) => latestMargin(one) - latestMargin(other));
    const creep = closest && creepOf(closest, targetMarginDb);
    return creep ? [creep] : [];
  });
}

type Measured = JudgedMargin & { marginDb: number; spreadDb: number };

/** The newest build's own verdict cuts nothing: a creep ends as a loss, and a step there is told from it by its shape. */
function sinceLastChange(series: readonly JudgedMargin[]): Measured[] {
  const changedAt = series.slice(0, -1).findLastIndex(({ verdict }) => verdict === 'lost' || verdict === 'gained');
  return series.slice(Math.max(changedAt, 0)).filter(isMeasured);
}

/** A margin that the bench made says nothing of the product. */
function isMeasured(one: JudgedMargin): one is Measured {
  return one.marginDb !== null && one.spreadDb !== null && !one.isBenchSuspected;
}

function isLongEnough(series: readonly Measured[]): boolean {
  return series.length > REFERENCE_BUILDS;
}

function latestMargin(series: readonly Measured[]): number {
  return series[series.length - 1].marginDb;
}

function creepOf(series: readonly Measured[], targetMarginDb: number): CreepOfBand | undefined {
  const first = series.slice(0, REFERENCE_BUILDS);
  const referenceDb = first.reduce((sum, { marginDb }) => sum + marginDb, 0) / first.length;
  const latest = series[series.length - 1];
  const creep = findCreep(series, referenceDb, latest.spreadDb, targetMarginDb);
  return creep ? { state: latest.state, band: latest.band, marginDb: latest.marginDb, creep } : undefined;
}
