import type { BandJudgement } from '@shared/judging/band-judgement';
import { decideGate, type GateVerdict, type RequiredSeries } from '@shared/judging/decide-gate';
import { formatDecibels } from '@shared/units/format-decibels';
import { findBuildOf } from '../builds/find-build';
import type { Context } from '../context';
import { findDropsShownBy } from '../drops/find-drops';
import type { FoundProduct } from '../products/find-product';
import { targetMarginOf } from '../products/target-margin';
import { bindingJudgements } from './binding-judgements';
import { buildJudgements } from './build-judgements';
import { listMeasuredLines, listRequiredStates } from './gate-store';
import { listMeasuredBefore } from './judged-build-store';
import { requiredSeries } from './required-series';
import { seriesPlan } from './series-plan';

/** Earlier builds whose lines a build must be measured on too. */
const BUILDS_LOOKED_AT = 5;

interface Decision {
  readonly verdict: GateVerdict;
  readonly reasons: readonly { readonly code: string; readonly text: string }[];
}

export interface BuildGate extends Decision {
  readonly targetMarginDb: number;
  readonly isJudged: boolean;
  /** What was counted; an accepted loss is "held" here. */
  readonly judgements: readonly BandJudgement[];
  readonly required: readonly RequiredSeries[];
}

/**
 * Decides whether a build may pass a pipeline, on its latest judgement. A loss the team accepted is listed and stops
 * nothing; its margin to limit and target counts like any other.
 *
 * @throws ServiceError `notFound` for revisions without a build
 */
export function decideBuildGate(
  context: Context,
  { product, team }: FoundProduct,
  { hardware, firmware }: { hardware: string; firmware: string },
  ownTargetMarginDb: number | undefined,
): BuildGate {
  const { build } = findBuildOf(context, product.id, hardware, firmware);
  const all = buildJudgements(context, build.id);
  const binding = bindingJudgements(all);
  const isAccepted = acceptedPlaces(context, build.id);
  const counted = all.filter((one) => binding.includes(one) || one.verdict === 'lost');
  const accepted = counted.filter((one) => one.verdict === 'lost' && isAccepted(one));
  const gate = {
    targetMarginDb: ownTargetMarginDb ?? targetMarginOf(product, team),
    isJudged: build.judgedAt !== null && build.dataVersion <= build.judgedVersion,
    judgements: counted.map((one) => (accepted.includes(one) ? { ...one, verdict: 'held' as const } : one)),
    required: requiredSeries(measurementPlan(context, product, build), all),
  };
  const { verdict, reasons } = decideOrIncomplete(gate);
  return { ...gate, verdict, reasons: [...reasons, ...accepted.map(acceptedReason)] };
}

function decideOrIncomplete(gate: Omit<BuildGate, keyof Decision>): Decision {
  if (gate.required.length > 0) return decideGate(gate);
  const text = 'nothing was measured yet, or no operating state of the product is required';
  return { verdict: 'incomplete', reasons: [{ code: 'notMeasured', text }] };
}

function measurementPlan(context: Context, product: FoundProduct['product'], build: { id: number; position: number }) {
  const before = listMeasuredBefore(context.db, product.id, build.position, BUILDS_LOOKED_AT).map(({ id }) => id);
  const bandsOf = (detector: 'QP' | 'AV') => seriesPlan(product.limitSetKey, detector, []).bands.map(({ key }) => key);
  return {
    stateNames: listRequiredStates(context.db, product.id),
    lines: listMeasuredLines(context.db, [...before, build.id]),
    bands: { QP: bandsOf('QP'), AV: bandsOf('AV') },
  };
}

/** Where losses the build shows were accepted, on it or on an earlier build: by operating state and band. */
function acceptedPlaces(context: Context, buildId: number): (judgement: BandJudgement) => boolean {
  const drops = findDropsShownBy(context, buildId).filter(({ state }) => state === 'accepted');
  return ({ stateId, band }) => drops.some((drop) => drop.stateId === stateId && drop.band === band);
}

function acceptedReason({
  stateName,
  line,
  detector,
  band,
  differenceDb,
}: BandJudgement): BuildGate['reasons'][number] {
  const loss = formatDecibels(-(differenceDb ?? 0));
  return { code: 'acceptedLoss', text: `${stateName}, ${line} ${detector}, ${band}: the loss of ${loss} was accepted` };
}
