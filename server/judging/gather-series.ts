import { groupBy } from '@shared/collections/group-by';
import { DETECTORS, LINES } from '@shared/detectors/detectors';
import type { BandInput, SeriesInput } from '@shared/judging/build-input';
import { chooseReference, type ChosenReference, type EarlierBuild } from '@shared/judging/choose-reference';
import type { RunMargin } from '@shared/judging/run-margin';
import type { BuildRecord } from './build-record';
import type { JudgedSweep } from './judged-sweep-store';
import { runMarginOf, type TraceFacts } from './run-margin-of';
import { type SeriesPlan, seriesPlan } from './series-plan';
import type { EarlierVerdict } from './verdict-store';

/** A band of a series before it is judged, with what it was drawn from. */
export interface GatheredBand {
  readonly input: BandInput;
  readonly reference: ChosenReference;
  readonly buildSweeps: readonly JudgedSweep[];
  readonly referenceSweeps: readonly JudgedSweep[];
}

export interface GatheredSeries extends Omit<SeriesInput, 'bands'> {
  readonly plan: SeriesPlan;
  readonly bands: readonly GatheredBand[];
}

/** Reads what only the trace tells, for the sweeps of the two sides that are compared. */
export type ReadTraceFacts = (sweep: JudgedSweep, band: string, frequencyHz: number) => TraceFacts;

interface Place {
  readonly stateId: number;
  readonly line: string;
  readonly detector: string;
}

export function seriesKey({ stateId, line, detector }: Place): string {
  return `${stateId} ${line} ${detector}`;
}

/** The build's sweeps by series and band, each with the runs of the earlier builds it is compared with. */
export function gatherSeries(record: BuildRecord, readFacts: ReadTraceFacts): GatheredSeries[] {
  const earlierSweeps = groupBy(record.earlierSweeps, seriesKey);
  const verdicts = new Map(record.earlierVerdicts.map((verdict) => [verdictKey(verdict), verdict]));
  const series = [...groupBy(record.sweeps, seriesKey).entries()].map(([key, sweeps]) =>
    gatherOne(record, sweeps, earlierSweeps.get(key) ?? [], verdicts, readFacts),
  );
  const order = new Map(record.sweeps.map(({ stateId, statePosition }) => [stateId, statePosition]));
  return series.sort(
    (a, b) =>
      (order.get(a.stateId) ?? 0) - (order.get(b.stateId) ?? 0) ||
      LINES.indexOf(a.line) - LINES.indexOf(b.line) ||
      DETECTORS.indexOf(a.detector) - DETECTORS.indexOf(b.detector),
  );
}

function gatherOne(
  record: BuildRecord,
  sweeps: readonly JudgedSweep[],
  earlierSweeps: readonly JudgedSweep[],
  verdicts: ReadonlyMap<string, EarlierVerdict>,
  readFacts: ReadTraceFacts,
): GatheredSeries {
  const { stateId, stateName, line, detector } = sweeps[0];
  const plan = seriesPlan(record.product.limitSetKey, detector, record.team.bands);
  const taken = new Set(sweeps.flatMap((sweep) => sweep.bands.map(({ band }) => band)));
  // Sweeps keep what was taken in bands the team has given up since.
  const bands = plan.bands.map(({ key }) => key).filter((band) => taken.has(band));
  const sweepsOf = groupBy(earlierSweeps, ({ buildId }) => buildId);
  return {
    stateId,
    stateName,
    line,
    detector,
    limitLineKey: plan.limitLineKey,
    plan,
    bands: bands.map((band) => {
      const measured = record.earlier.filter(({ id }) => sweepsOf.get(id)?.some((sweep) => runMarginOf(sweep, band)));
      const earlier = measured.map(({ id }): EarlierBuild => {
        const verdict = verdicts.get(verdictKey({ buildId: id, stateId, line, detector, band }));
        return { buildId: id, judgement: verdict ?? null };
      });
      const reference = chooseReference(earlier, record.chosenBuildId);
      const of = (ids: readonly number[]) => ids.flatMap((id) => sweepsOf.get(id) ?? []);
      const referenceSweeps = of(reference.buildIds);
      return {
        reference,
        buildSweeps: sweeps,
        referenceSweeps,
        input: {
          band,
          build: closeRuns(sweeps, band, readFacts),
          reference: closeRuns(referenceSweeps, band, readFacts),
          previous: runs(of(measured.slice(-1).map(({ id }) => id)), band),
          history: runs(of(reference.historyIds), band),
          spread: null,
          guards: [],
        },
      };
    }),
  };
}

function runs(sweeps: readonly JudgedSweep[], band: string): RunMargin[] {
  return sweeps.flatMap((sweep) => runMarginOf(sweep, band) ?? []);
}

function closeRuns(sweeps: readonly JudgedSweep[], band: string, readFacts: ReadTraceFacts): RunMargin[] {
  return sweeps.flatMap((sweep) => {
    const run = runMarginOf(sweep, band);
    return run ? [{ ...run, ...readFacts(sweep, band, run.frequencyHz) }] : [];
  });
}

function verdictKey(place: Place & { buildId: number; band: string }): string {
  return `${place.buildId} ${seriesKey(place)} ${place.band}`;
}
