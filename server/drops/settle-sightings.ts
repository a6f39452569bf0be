import { OPEN_DROP_STATES } from '@shared/contracts/drops';
import type { BandJudgement } from '@shared/judging/band-judgement';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { describeSighting, type SightingKind } from './describe-sighting';
import { describeStanding } from './describe-standing';
import { lossFault } from './drop-policy';
import { updateDrop } from './drop-store';
import { recordDropEvent } from './record-drop-event';
import { deleteSighting, type SightedLoss, upsertSighting } from './sighting-store';
import { lossesOf, type StandingDrop } from './standing-drops';

/** A smaller change is not worth a line: figures are shown to 0.1 dB. */
const TOLD_DB = 0.1;

export interface SightedBuild {
  readonly id: number;
  readonly position: number;
  readonly hardware: string;
  readonly firmware: string;
}

/**
 * Writes down what a judged build says about the drops of other builds: that it shows the same loss, or that the margin is back.
 * Every change is one dated line in the drop's history; the same judgement again changes nothing, and no drop is moved.
 *
 * @param carried losses of the build that belong to drops of other builds, by drop
 */
export function settleSightings(
  context: Context,
  actor: Actor,
  build: SightedBuild,
  standing: readonly StandingDrop[],
  carried: ReadonlyMap<number, SightedLoss>,
  judgements: readonly BandJudgement[],
): void {
  for (const one of standing) {
    const { drop, sightings } = one;
    if (drop.buildId === build.id) continue;
    const place = judgements.filter(({ stateId, band }) => stateId === drop.stateId && band === drop.band);
    const former = sightings.find(({ buildId }) => buildId === build.id);
    const loss = carried.get(drop.id);
    const text = loss
      ? seeLoss(context, build, one, former?.loss, loss)
      : marginIsBack(one, build, place)
        ? seeMarginBack(context, build, one, former?.loss, place)
        : former && takeBack(context, build, one, former.loss, place);
    if (!text) continue;
    // A drop somebody closed is not brought up again.
    if (isOpen(one)) updateDrop(context.db, drop.id, { updatedAt: context.now() });
    recordDropEvent(context, actor, drop, { kind: 'evidence', text });
  }
}

type Former = SightedLoss | null | undefined;

function seeLoss(
  context: Context,
  build: SightedBuild,
  standing: StandingDrop,
  former: Former,
  loss: SightedLoss,
): string | null {
  if (former && !isTold(former, loss)) return null;
  upsertSighting(context.db, { dropId: standing.drop.id, buildId: build.id, loss });
  return describeSighting(kindOf(standing, build), nameOf(build), loss, former ?? undefined);
}

function isTold(before: SightedLoss, now: SightedLoss): boolean {
  return (
    Math.abs(now.differenceDb - before.differenceDb) >= TOLD_DB ||
    Math.abs(now.marginDb - before.marginDb) >= TOLD_DB ||
    now.isOverLimit !== before.isOverLimit
  );
}

function kindOf(standing: StandingDrop, build: SightedBuild): SightingKind {
  const others = lossesOf(standing).filter(({ buildId }) => buildId !== build.id);
  const latest = others.findLast(({ position }) => position < build.position);
  if (latest === undefined) return 'Already there';
  return isBackSince(standing, latest.position, build) ? 'There again' : 'Still there';
}

/** Whether a build between the position and this one has the margin back. */
function isBackSince({ sightings }: StandingDrop, position: number, build: SightedBuild): boolean {
  return sightings.some((one) => one.loss === null && one.position > position && one.position < build.position);
}

/** Judged held or gained in every series that lost, with the margin from before the loss. */
function marginIsBack({ drop }: StandingDrop, build: SightedBuild, place: readonly BandJudgement[]): boolean {
  const { witnesses } = drop.evidence;
  const isSettled = witnesses.every(({ line, detector }) =>
    place.some(
      (one) => one.line === line && one.detector === detector && (one.verdict === 'held' || one.verdict === 'gained'),
    ),
  );
  return isSettled && lossFault(drop, witnesses, { name: nameOf(build), judgements: place }) === null;
}

/** Told of the first build only, and only after all that show the loss. */
function seeMarginBack(
  context: Context,
  build: SightedBuild,
  standing: StandingDrop,
  former: Former,
  place: readonly BandJudgement[],
): string | null {
  if (former === null) return null;
  const { drop } = standing;
  const latest = lossesOf(standing).findLast(({ buildId }) => buildId !== build.id);
  const latestPosition = latest?.position ?? standing.position;
  const isNews =
    drop.state !== 'fixed' && latestPosition < build.position && !isBackSince(standing, latestPosition, build);
  if (!isNews) return former === undefined ? null : takeBack(context, build, standing, former, place);
  upsertSighting(context.db, { dropId: drop.id, buildId: build.id, loss: null });
  const { line, detector } = drop.evidence.witnesses[0];
  const lead = place.find((one) => one.line === line && one.detector === detector);
  return describeSighting('No longer seen', nameOf(build), {
    differenceDb: lead?.differenceDb ?? 0,
    marginDb: lead?.worst?.marginDb ?? 0,
  });
}

function takeBack(
  context: Context,
  build: SightedBuild,
  { drop }: StandingDrop,
  former: SightedLoss | null,
  place: readonly BandJudgement[],
): string {
  deleteSighting(context.db, drop.id, build.id);
  const isLost = place.some(({ verdict }) => verdict === 'lost');
  if (former !== null && isLost) return `The loss in ${nameOf(build)} is another one.`;
  const what = former === null ? 'no longer shows the margin back' : 'is no longer judged lost';
  return `${nameOf(build)} ${what}: ${describeStanding(place)}`;
}

function isOpen({ drop }: StandingDrop): boolean {
  return OPEN_DROP_STATES.some((state) => state === drop.state);
}

function nameOf({ hardware, firmware }: SightedBuild): string {
  return `${hardware} / ${firmware}`;
}
