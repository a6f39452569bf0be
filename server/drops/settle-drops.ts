import { type DropEvidence, OPEN_DROP_STATES } from '@shared/contracts/drops';
import type { BandJudgement } from '@shared/judging/band-judgement';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { describeEvidenceChange } from './describe-evidence-change';
import { describeStanding } from './describe-standing';
import { type DropRow, insertDrop, latestDataEvent, listDropsOfBuild, updateDrop } from './drop-store';
import { recordDropEvent } from './record-drop-event';

/** A loss as it was judged now. */
export interface DropCase extends Pick<
  DropRow,
  'stateId' | 'band' | 'differenceDb' | 'marginDb' | 'frequencyHz' | 'isOverLimit' | 'sentence'
> {
  readonly evidence: DropEvidence;
}

interface SettledBuild {
  readonly id: number;
  readonly product: { readonly id: number; readonly teamId: number; readonly key: string };
}

/**
 * Brings the drops of a build in line with its judgement: new losses are raised, known ones keep their state and take on
 * changed evidence with a dated line, those the data no longer support are withdrawn. The same judgement again changes
 * nothing. Called in the transaction of the judgement.
 */
export function settleDrops(
  context: Context,
  actor: Actor,
  build: SettledBuild,
  cases: readonly DropCase[],
  judgements: readonly BandJudgement[],
): void {
  const standing = new Map(listDropsOfBuild(context.db, build.id).map((drop) => [placeKey(drop), drop]));
  for (const dropCase of cases) {
    const drop = standing.get(placeKey(dropCase));
    standing.delete(placeKey(dropCase));
    if (drop === undefined) raise(context, actor, build, dropCase);
    else uphold(context, actor, drop, dropCase);
  }
  for (const drop of standing.values()) {
    const place = judgements.filter(({ stateId, band }) => stateId === drop.stateId && band === drop.band);
    withdraw(context, actor, drop, describeStanding(place));
  }
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
  const isReturning = latestDataEvent(context.db, drop.id)?.kind === 'withdrawn';
  const change = describeEvidenceChange(drop, dropCase);
  const isSame = JSON.stringify(drop.evidence) === JSON.stringify(dropCase.evidence);
  if (isSame && change === null && !isReturning) return;
  const isVisible = change !== null || isReturning;
  updateDrop(context.db, drop.id, {
    ...dropCase,
    ...(drop.state === 'withdrawn' && { state: 'new' }),
    ...(isVisible && { updatedAt: context.now() }),
  });
  if (isReturning) {
    recordDropEvent(context, actor, drop, { kind: 'raised', text: `The data show it again. ${dropCase.sentence}` });
  } else if (change !== null) {
    recordDropEvent(context, actor, drop, { kind: 'evidence', text: change });
  }
}

/** A drop somebody closed with a reason keeps that state; its history says that the data changed. */
function withdraw(context: Context, actor: Actor, drop: DropRow, standing: string): void {
  if (latestDataEvent(context.db, drop.id)?.kind === 'withdrawn') return;
  const isOpen = OPEN_DROP_STATES.some((state) => state === drop.state);
  updateDrop(context.db, drop.id, { updatedAt: context.now(), ...(isOpen && { state: 'withdrawn' }) });
  recordDropEvent(context, actor, drop, { kind: 'withdrawn', text: `The data no longer support it: ${standing}` });
}

function placeKey({ stateId, band }: Pick<DropRow, 'stateId' | 'band'>): string {
  return JSON.stringify([stateId, band]);
}
