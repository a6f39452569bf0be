import { groupBy } from '@shared/collections/group-by';
import { bandsFor, teamBand } from '@shared/limits/bands';
import { findLimitSet } from '@shared/limits/limit-sets';
import type { TrendView } from '@shared/contracts/margins';
import { listBuilds } from '../builds/list-builds';
import type { Context } from '../context';
import { isoTime } from '../iso-time';
import type { FoundProduct } from '../products/find-product';
import { targetMarginOf } from '../products/target-margin';
import { ServiceError } from '../service-error';
import { listBandPoints, listWorstPoints, type SeriesChoice, type TrendSweep } from './trend-store';

/**
 * The worst margin of every build of a product, with how far its repeats lie apart.
 *
 * @param band key of a band, or undefined for the whole range
 * @throws ServiceError `invalid` for a band the product's limit plan does not have
 */
export function trend(
  context: Context,
  { product, team }: FoundProduct,
  choice: SeriesChoice,
  band?: string,
): TrendView {
  const bands = bandKeys(product.limitSetKey, team.bands);
  if (band !== undefined && !bands.includes(band)) {
    throw new ServiceError('invalid', `band: "${band}" is none of ${bands.join(', ')}`);
  }
  const { db } = context;
  const sweeps =
    band === undefined ? listWorstPoints(db, product.id, choice) : listBandPoints(db, product.id, choice, band);
  const byBuild = groupBy(sweeps, (sweep) => sweep.buildId);
  return {
    product: product.key,
    limitSetKey: product.limitSetKey,
    targetMarginDb: targetMarginOf(product, team),
    band: band ?? null,
    bands,
    referenceBuildId: product.referenceBuildId,
    points: listBuilds(context, product.id).map(({ build, hardware, firmware, openDrops }) => ({
      buildId: build.id,
      hardware,
      firmware,
      builtAt: isoTime(build.builtAt),
      ...worstSeries(byBuild.get(build.id) ?? []),
      verdict: build.verdict,
      openDrops,
      switching: build.switching.map(({ stage, frequencyHz }) => ({ stage, frequencyHz })),
    })),
  };
}

function bandKeys(limitSetKey: string, teamBands: { name: string; fromHz: number; toHz: number }[]): string[] {
  const own = teamBands.map(teamBand);
  const lines = findLimitSet(limitSetKey)?.lines ?? [];
  return [...new Set(lines.flatMap((line) => bandsFor(line, own)).map(({ key }) => key))];
}

type TrendPoint = TrendView['points'][number];

/** The series with the least margin stands for the build; the spread is that of its own runs, never between series. */
function worstSeries(
  sweeps: readonly TrendSweep[],
): Pick<TrendPoint, 'worstMarginDb' | 'worstFrequencyHz' | 'runs' | 'lowestDb' | 'highestDb'> {
  let worst: (TrendSweep & { marginDb: number }) | undefined;
  for (const sweep of sweeps)
    if (hasMargin(sweep) && (worst === undefined || sweep.marginDb < worst.marginDb)) worst = sweep;
  if (worst === undefined)
    return { worstMarginDb: null, worstFrequencyHz: null, runs: 0, lowestDb: null, highestDb: null };
  const { stateId, line, detector } = worst;
  const series = sweeps
    .filter(hasMargin)
    .filter((sweep) => sweep.stateId === stateId && sweep.line === line && sweep.detector === detector);
  // As when it is judged: the name of a session alone may come again on another bench or unit.
  const runs = groupBy(series, ({ run, benchId, unitId }) => JSON.stringify([run, benchId, unitId]));
  const perRun = [...runs.values()].map((run) => Math.min(...run.map(({ marginDb }) => marginDb)));
  return {
    worstMarginDb: worst.marginDb,
    worstFrequencyHz: worst.frequencyHz,
    runs: perRun.length,
    lowestDb: Math.min(...perRun),
    highestDb: Math.max(...perRun),
  };
}

function hasMargin(sweep: TrendSweep): sweep is TrendSweep & { marginDb: number } {
  return sweep.marginDb !== null;
}
