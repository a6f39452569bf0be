import type { BandJudgement } from '@shared/judging/band-judgement';
import type { GuardHit } from '@shared/judging/guard-hit';
import type { Context } from '../context';
import { benchHits } from './bench-guards';
import type { BuildRecord } from './build-record';
import { type GatheredSeries, seriesKey } from './gather-series';
import { sameDayHits } from './same-day-guard';

/**
 * Adds to every band that changed by the threshold or more the signs that the bench moved and not the product.
 *
 * Smaller changes are left alone: a session that reads a decibel high all over the range is the ordinary spread of a bench,
 * and must stay in it.
 *
 * @param judgements of the series without guards
 * @returns the series with their guards, or null when there are none
 */
export function guardSeries(
  context: Context,
  record: BuildRecord,
  all: readonly GatheredSeries[],
  judgements: readonly BandJudgement[],
): GatheredSeries[] | null {
  const changed = new Map(
    judgements
      .filter(({ differenceDb }) => differenceDb !== null && Math.abs(differenceDb) >= record.thresholdDb)
      .map((judgement) => [bandKey(judgement, judgement.band), judgement]),
  );
  if (changed.size === 0) return null;
  const readBench = benchHits(record.product.limitSetKey, record.sweeps);
  const readSameDay = sameDayHits(context, record);
  let isGuarded = false;
  const guarded = all.map((series) => ({
    ...series,
    bands: series.bands.map((band) => {
      const judgement = changed.get(bandKey(series, band.input.band));
      if (judgement === undefined) return band;
      const sameDay = readSameDay(judgement);
      const guards: GuardHit[] = [...readBench(series, band), ...(sameDay ? [sameDay] : [])];
      if (guards.length > 0) isGuarded = true;
      return { ...band, input: { ...band.input, guards } };
    }),
  }));
  return isGuarded ? guarded : null;
}

function bandKey(series: Parameters<typeof seriesKey>[0], band: string): string {
  return `${seriesKey(series)} ${band}`;
}
