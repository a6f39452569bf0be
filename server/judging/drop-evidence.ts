import type { DropEvidence } from '@shared/contracts/drops';
import { nameHarmonic } from '@shared/harmonics/match-harmonic';
import type { BandJudgement } from '@shared/judging/band-judgement';
import { METHOD_VERSION } from '@shared/judging/method-version';
import type { Context } from '../context';
import { localDay } from '../sweeps/local-day';
import type { BuildRecord } from './build-record';
import { declaredChanges } from './declared-changes';
import type { GatheredBand } from './gather-series';
import { type JudgedBuild, listBuildsBetween } from './judged-build-store';
import { planSet } from './series-plan';
import { setUpTable } from './set-up-table';

export interface EvidenceParts {
  /** Series that lost, the one the drop is described by first. */
  readonly witnesses: readonly BandJudgement[];
  /** The latest build of the reference. */
  readonly reference: JudgedBuild;
  readonly toleranceHz: number;
}

/** The frozen copy of what a drop was judged on. */
export function dropEvidence(
  context: Context,
  record: BuildRecord,
  gathered: GatheredBand,
  { witnesses, reference, toleranceHz }: EvidenceParts,
): DropEvidence {
  const { build, product, team, targetMarginDb, thresholdDb, earlier } = record;
  const lead = witnesses[0];
  const named = ({ id, hardware, firmware }: JudgedBuild) => ({ id, hardware, firmware });
  const previous = earlier.at(-1);
  const since = listBuildsBetween(context.db, product.id, reference.position, build.position);
  const buildSweepIds = sortedIds(witnesses.flatMap((witness) => witness.buildSweepIds));
  const referenceSweepIds = sortedIds(witnesses.flatMap((witness) => witness.referenceSweepIds));
  const harmonic = lead.worst && nameHarmonic(lead.worst.frequencyHz, build.switching, toleranceHz);
  return {
    methodVersion: METHOD_VERSION,
    limitSetKey: product.limitSetKey,
    limitSetVersion: planSet(product.limitSetKey).version,
    thresholdDb,
    targetMarginDb,
    referenceKind: gathered.reference.kind === 'chosen' ? 'chosen' : 'pooled',
    referenceBuilds: earlier.filter(({ id }) => gathered.reference.buildIds.includes(id)).map(named),
    previousBuild: previous ? named(previous) : null,
    buildSweepIds,
    referenceSweepIds,
    witnesses: witnesses.map((judgement) => ({ line: judgement.line, detector: judgement.detector, judgement })),
    setUp: setUpTable(
      record.sweeps.filter(({ id }) => buildSweepIds.includes(id)),
      record.earlierSweeps.filter(({ id }) => referenceSweepIds.includes(id)),
      (at) => localDay(at, team.timeZone),
    ),
    changes: declaredChanges(reference, build, since),
    harmonic: harmonic && { stage: harmonic.stage, order: harmonic.order, expectedHz: harmonic.expectedHz },
  };
}

function sortedIds(ids: readonly number[]): number[] {
  return [...new Set(ids)].sort((a, b) => a - b);
}
