import { type DropEvidence, OPEN_DROP_STATES } from '@shared/contracts/drops';
import type { BandJudgement } from '@shared/judging/band-judgement';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { markStale } from '../judging/mark-stale';
import { describeEvidenceChange } from './describe-evidence-change';
import { describeStanding } from './describe-standing';
import { type DropRow, insertDrop, listDropsOfBuild, updateDrop } from './drop-store';
import { recordDropEvent } from './record-drop-event';
import { type SightedBuild, settleSightings } from './settle-sightings';
import { deleteSightings, listSightings, type SightedLoss } from './sighting-store';
import { findStandingDrop, listStandingDrops } from './standing-drops';

/** A loss as it was judged now. */
export interface DropCase extends Pick<
  DropRow,
  'stateId' | 'band' | 'differenceDb' | 'marginDb' | 'frequencyHz' | 'isOverLimit' | 'sentence'
> {
  readonly evidence: DropEvidence;
}

interface SettledBuild extends SightedBuild {
  readonly product: { readonly id: number; readonly teamId: number; readonly key: string };
}

/**
 * Brings the drops of a build in line with its judgement. A loss an earlier build had already belongs to that build's drop; any
 * other is raised. Drops of the build keep their state and take on changed evidence with a dated line; those the data no longer
 * support are withdrawn. The same judgement again changes nothing. Called in the transaction of the judgement.
 */
export function settleDrops(
  context: Context,
  actor: Actor,
  build: SettledBuild,
  cases: readonly DropCase[],
  judgements: readonly BandJudgement[],
): void {
  const own = new Map(listDropsOfBuild(context.db, build.id).map((drop) => [placeKey(drop), drop]));
  const standing = listStandingDrops(context, build.product.id);
  const carried = new Map<number, SightedLoss>();
  for (const dropCase of cases) {
    const drop = own.get(placeKey(dropCase));
    own.delete(placeKey(dropCase));
    // Once raised, a drop stays on its build.
    const isOwn = drop !== undefined && drop.state !== 'withdrawn';
    const known = isOwn ? undefined : findStandingDrop(context, standing, build, lostPlace(dropCase, judgements));
    if (known) carried.set(known.drop.id, sightedLoss(dropCase));
    else if (drop) uphold(context, actor, drop, dropCase);
    else raise(context, actor, build, dropCase);
  }
  for (const drop of own.values()) withdraw(context, actor, drop, describeStanding(placeOf(judgements, drop)));
  settleSightings(context, actor, build, standing, carried, judgements);
}

function lostPlace({ stateId, band, frequencyHz, evidence }: DropCase, judgements: readonly BandJudgement[]) {
  const { harmonic } = evidence;
  return { stateId, band, frequencyHz, harmonic, judgements: placeOf(judgements, { stateId, band }) };
}

function sightedLoss({ differenceDb, marginDb, frequencyHz, isOverLimit, evidence }: DropCase): SightedLoss {
  return { differenceDb, marginDb, frequencyHz, isOverLimit, harmonic: evidence.harmonic };
}

function placeOf(judgements: readonly BandJudgement[], place: Pick<DropRow, 'stateId' | 'band'>): BandJudgement[] {
  return judgements.filter(({ stateId, band }) => stateId === place.stateId && band === place.band);
}

function raise(context: Context, actor: Actor, { id: buildId, product }: SettledBuild, dropCase: DropCase): void {
  const now = context.now();
  const drop = insertDrop(context.db, {
    ...dropCase,
    teamId: product.teamId,
    productId: product.id,
    buildId,
    state: 'new',
    createdAt: now,
    updatedAt: now,
  });
  recordDropEvent(context, actor, drop, { kind: 'raised', text: dropCase.sentence });
}

function uphold(context: Context, actor: Actor, drop: DropRow, dropCase: DropCase): void {
  const isReturning = !drop.isSupported;
  const change = describeEvidenceChange(drop, dropCase);
  const isSame = JSON.stringify(drop.evidence) === JSON.stringify(dropCase.evidence);
  if (isSame && change === null && !isReturning) return;
  const isVisible = change !== null || isReturning;
  updateDrop(context.db, drop.id, {
    ...dropCase,
    isSupported: true,
    ...(drop.state === 'withdrawn' && { state: 'new' }),
    ...(isVisible && { updatedAt: context.now() }),
  });
  if (isReturning) {
    recordDropEvent(context, actor, drop, { kind: 'raised', text: `The data show it again. ${dropCase.sentence}` });
  } else if (change !== null) {
    recordDropEvent(context, actor, drop, { kind: 'evidence', text: change });
  }
}

/**
 * A drop somebody closed with a reason keeps that state; its history says that the data changed. Builds that showed the same
 * loss are judged again, to raise it for themselves.
 */
function withdraw(context: Context, actor: Actor, drop: DropRow, standing: string): void {
  if (!drop.isSupported) return;
  const isOpen = OPEN_DROP_STATES.some((state) => state === drop.state);
  updateDrop(context.db, drop.id, {
    isSupported: false,
    updatedAt: context.now(),
    ...(isOpen && { state: 'withdrawn' }),
  });
  recordDropEvent(context, actor, drop, { kind: 'withdrawn', text: `The data no longer support it: ${standing}` });
  const first = listSightings(context.db, [drop.id]).find(({ loss }) => loss !== null);
  deleteSightings(context.db, drop.id);
  if (first) markStale(context, drop.productId, first.position);
}

function placeKey({ stateId, band }: Pick<DropRow, 'stateId' | 'band'>): string {
  return JSON.stringify([stateId, band]);
}
