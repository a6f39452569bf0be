import { groupBy } from '@shared/collections/group-by';
import type { BandJudgement } from '@shared/judging/band-judgement';
import { MAX_POOLED_BUILDS } from '@shared/judging/choose-reference';
import { type OtherProductShift, sameDayShift } from '@shared/judging/same-day-shift';
import { mean } from 'simple-statistics';
import type { Context } from '../context';
import type { BuildRecord } from './build-record';
import { type GatheredSeries, seriesKey } from './gather-series';
import { type DaySweep, listOtherProductSweeps, listSweepsBefore } from './same-day-store';

/** Sweeps no further apart belong to one day at the bench, whatever the calendar of its time zone says. */
const SAME_DAY_MS = 12 * 3600_000;

/**
 * Adds to every changed band what other products measured on the same bench and day did. Their change is taken from the
 * sweeps themselves, not from verdicts, so that it does not matter which product is judged first.
 *
 * @returns the series with the guards, or null when no other product moved along
 */
export function withSameDayGuards(
  context: Context,
  record: BuildRecord,
  all: readonly GatheredSeries[],
  judgements: readonly BandJudgement[],
): GatheredSeries[] | null {
  const changed = judgements.filter(({ verdict }) => verdict === 'lost' || verdict === 'gained');
  if (changed.length === 0) return null;
  const others = otherChanges(context, record);
  const hits = new Map(
    changed.flatMap((judgement) => {
      const shifts = shiftsOf(others, judgement);
      const hit = sameDayShift(judgement.differenceDb ?? 0, shifts, record.thresholdDb);
      return hit ? [[`${seriesKey(judgement)} ${judgement.band}`, hit] as const] : [];
    }),
  );
  if (hits.size === 0) return null;
  return all.map((series) => ({
    ...series,
    bands: series.bands.map((band) => {
      const hit = hits.get(`${seriesKey(series)} ${band.input.band}`);
      return hit ? { ...band, input: { ...band.input, guards: [...band.input.guards, hit] } } : band;
    }),
  }));
}

/** Builds of other products measured on the same benches within the day. */
export function buildsOfTheDay(context: Context, { product, sweeps }: BuildRecord): number[] {
  return [...new Set(sweepsOfTheDay(context, product.id, sweeps).map(({ buildId }) => buildId))];
}

function sweepsOfTheDay(context: Context, productId: number, sweeps: BuildRecord['sweeps']): DaySweep[] {
  const days = [...groupBy(sweeps, ({ benchId }) => benchId)];
  return days.flatMap(([benchId, onBench]) => {
    const times = onBench.map(({ takenAt }) => takenAt);
    const [from, to] = [Math.min(...times) - SAME_DAY_MS, Math.max(...times) + SAME_DAY_MS];
    const found = listOtherProductSweeps(context.db, productId, [benchId], from, to);
    return found.filter(({ takenAt }) => times.some((at) => Math.abs(at - takenAt) <= SAME_DAY_MS));
  });
}

interface OtherChange {
  readonly productName: string;
  readonly today: readonly DaySweep[];
  readonly before: readonly DaySweep[];
}

function otherChanges(context: Context, { product, sweeps }: BuildRecord): OtherChange[] {
  const today = sweepsOfTheDay(context, product.id, sweeps);
  return [...groupBy(today, ({ buildId }) => buildId).values()].map((ofBuild) => {
    const { productId, productName, position } = ofBuild[0];
    const dayStart = Math.min(...ofBuild.map(({ takenAt }) => takenAt)) - SAME_DAY_MS;
    const positions = [position - MAX_POOLED_BUILDS, position] as const;
    return { productName, today: ofBuild, before: listSweepsBefore(context.db, productId, positions, dayStart) };
  });
}

/** Change of each other product in the band, the mean over its states; products without earlier sweeps tell nothing. */
function shiftsOf(others: readonly OtherChange[], { line, detector, band }: BandJudgement): OtherProductShift[] {
  return others.flatMap(({ productName, today, before }) => {
    const inSeries = (sweep: DaySweep) => sweep.line === line && sweep.detector === detector;
    const now = marginsByState(today.filter(inSeries), band);
    const then = marginsByState(before.filter(inSeries), band);
    const differences = [...now].flatMap(([stateId, margins]) => {
      const earlier = then.get(stateId);
      return earlier ? [mean(margins) - mean(earlier)] : [];
    });
    return differences.length > 0 ? [{ productName, differenceDb: mean(differences) }] : [];
  });
}

function marginsByState(sweeps: readonly DaySweep[], band: string): Map<number, number[]> {
  const margins = new Map<number, number[]>();
  for (const { stateId, bands } of sweeps) {
    const worst = bands.find((one) => one.band === band)?.worst;
    if (worst) margins.set(stateId, [...(margins.get(stateId) ?? []), worst.marginDb]);
  }
  return margins;
}
