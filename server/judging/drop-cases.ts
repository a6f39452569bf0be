import { describeDrop } from '@shared/harmonics/describe-drop';
import type { BandJudgement } from '@shared/judging/band-judgement';
import type { Drop } from '@shared/judging/drop';
import { dropsOf } from '@shared/judging/drops-of';
import type { Context } from '../context';
import type { DropCase } from '../drops/settle-drops';
import { bindingJudgements } from './binding-judgements';
import type { BuildRecord } from './build-record';
import { dropEvidence } from './drop-evidence';
import { type GatheredBand, type GatheredSeries, seriesKey } from './gather-series';
import type { JudgedBuild } from './judged-build-store';

/** The drops of a judged build with their sentences and evidence, most urgent first. */
export function dropCases(
  context: Context,
  record: BuildRecord,
  series: readonly GatheredSeries[],
  judgements: readonly BandJudgement[],
): DropCase[] {
  return dropsOf(judgements).map((drop) => dropCase(context, record, series, judgements, drop));
}

function dropCase(
  context: Context,
  record: BuildRecord,
  series: readonly GatheredSeries[],
  judgements: readonly BandJudgement[],
  drop: Drop,
): DropCase {
  const place = judgements.filter(({ stateId, band }) => stateId === drop.stateId && band === drop.band);
  const binding = bindingJudgements(place);
  const lost = place.filter(({ verdict }) => verdict === 'lost');
  const lead = lost.filter((one) => binding.includes(one)).sort(byMargin)[0] ?? drop.lead;
  const witnesses = [lead, ...lost.filter((judgement) => judgement !== lead)];
  const ofLead = series.find((one) => seriesKey(one) === seriesKey(lead));
  const gathered = ofLead?.bands.find(({ input }) => input.band === lead.band);
  if (ofLead === undefined || gathered === undefined) throw new Error(`band ${lead.band} was judged but not gathered`);
  const reference = latestReference(record, gathered);
  const { worst, referenceWorst, move, differenceDb } = lead;
  if (worst === null || referenceWorst === null || differenceDb === null) {
    throw new Error(`band ${drop.band} was judged lost without both sides`);
  }
  const toleranceHz = Math.max(...sidesOf(gathered, lead).map(({ stepHz }) => stepHz)) / 2;
  const range = ofLead.plan.bands.find(({ key }) => key === lead.band);
  return {
    stateId: drop.stateId,
    band: drop.band,
    differenceDb,
    marginDb: worst.marginDb,
    frequencyHz: worst.frequencyHz,
    isOverLimit: binding.some((judgement) => judgement.overLimit && lost.some(({ line }) => line === judgement.line)),
    sentence: describeDrop({
      build: record.build,
      reference,
      lossDb: -differenceDb,
      line: lead.line,
      detector: lead.detector,
      frequencyHz: worst.frequencyHz,
      marginDb: worst.marginDb,
      referenceFrequencyHz: referenceWorst.frequencyHz,
      levelChangeDb: move?.levelChangeDb ?? 0,
      // A band the team has since removed has no edges any more that something could have moved across.
      bandFromHz: range?.fromHz ?? 0,
      bandToHz: range?.toHz ?? Infinity,
      buildSwitching: record.build.switching,
      referenceSwitching: reference.switching,
      toleranceHz,
    }),
    evidence: dropEvidence(context, record, gathered, { witnesses, reference, toleranceHz }),
  };
}

/** Several builds pooled are named by their latest. */
function latestReference({ earlier }: BuildRecord, { reference }: GatheredBand): JudgedBuild {
  const latest = earlier.findLast(({ id }) => reference.buildIds.includes(id));
  if (latest === undefined) throw new Error('a band was judged lost without a reference build');
  return latest;
}

function sidesOf({ buildSweeps, referenceSweeps }: GatheredBand, lead: BandJudgement) {
  const ids = [...lead.buildSweepIds, ...lead.referenceSweepIds];
  return [...buildSweeps, ...referenceSweeps].filter(({ id }) => ids.includes(id));
}

function byMargin(a: BandJudgement, b: BandJudgement): number {
  return (a.worst?.marginDb ?? Infinity) - (b.worst?.marginDb ?? Infinity);
}
