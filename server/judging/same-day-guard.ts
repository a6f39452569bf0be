import { groupBy } from '@shared/collections/group-by';
import type { BandJudgement } from '@shared/judging/band-judgement';
import { MAX_POOLED_BUILDS } from '@shared/judging/choose-reference';
import type { GuardHit } from '@shared/judging/guard-hit';
import { type OtherProductShift, sameDayShift } from '@shared/judging/same-day-shift';
import { mean } from 'simple-statistics';
import type { Context } from '../context';
import type { BuildRecord } from './build-record';
import { type DaySweep, listOtherProductSweeps, listSweepsBefore } from './same-day-store';

/** Sweeps no further apart belong to one day at the bench, whatever the calendar of its time zone says. */
const SAME_DAY_MS = 12 * 3600_000;

/** Tells whether other products moved like a band did. */
export type ReadSameDayHit = (judgement: BandJudgement) => GuardHit | null;

/**
 * Prepares to tell what other products measured on the same bench and day did. Their change is taken from the sweeps
 * themselves, not from verdicts, so that it does not matter which product is judged first.
 */
export function sameDayHits(context: Context, record: BuildRecord): ReadSameDayHit {
  const others = otherChanges(context, record);
  return (judgement) => sameDayShift(judgement.differenceDb ?? 0, shiftsOf(others, judgement), record.thresholdDb);
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
