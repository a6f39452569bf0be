import type { BandJudgement } from '@shared/judging/band-judgement';
import { isFurtherLoss, isOtherLoss, type PlaceLoss } from '@shared/judging/same-loss';
import type { Context } from '../context';
import { buildJudgements } from '../judging/build-judgements';
import { listSupportedDrops, type PlacedDrop } from './drop-store';
import { listSightings, type PlacedSighting } from './sighting-store';

/** A drop the data support, with what other builds than its own say about it, oldest first. */
export interface StandingDrop extends PlacedDrop {
  readonly sightings: readonly PlacedSighting[];
}

/** Drops of a product that later builds may go on with. */
export function listStandingDrops(context: Context, productId: number): StandingDrop[] {
  const drops = listSupportedDrops(context.db, productId);
  const sightings = listSightings(
    context.db,
    drops.map(({ drop }) => drop.id),
  );
  return drops.map((placed) => ({
    ...placed,
    sightings: sightings.filter(({ dropId }) => dropId === placed.drop.id),
  }));
}

/** A build that shows the loss of a drop. */
interface SeenLoss extends Pick<PlaceLoss, 'frequencyHz' | 'harmonic'> {
  readonly buildId: number;
  readonly position: number;
}

/** Builds that show the loss of a drop, oldest first. */
export function lossesOf({ drop, position, sightings }: StandingDrop): SeenLoss[] {
  const own = { buildId: drop.buildId, position, frequencyHz: drop.frequencyHz, harmonic: drop.evidence.harmonic };
  const others = sightings.flatMap(({ loss, ...sighting }) => (loss === null ? [] : [{ ...sighting, ...loss }]));
  return [own, ...others].sort((a, b) => a.position - b.position);
}

interface LostBuild {
  readonly id: number;
  readonly position: number;
}

interface LostPlace extends PlaceLoss {
  readonly stateId: number;
  readonly band: string;
}

/**
 * The drop a build's loss belongs to, raised on another build: the newest before it whose loss is the same, or else the nearest
 * after it, for a build that was measured late. Undefined when the loss is news.
 *
 * A drop that was fixed stands for the builds before the one that shows the fix only.
 */
export function findStandingDrop(
  context: Context,
  drops: readonly StandingDrop[],
  build: LostBuild,
  now: LostPlace,
): StandingDrop | undefined {
  const here = drops.filter(
    ({ drop, fixedPosition }) =>
      drop.stateId === now.stateId &&
      drop.band === now.band &&
      drop.buildId !== build.id &&
      (drop.state !== 'fixed' || (fixedPosition ?? 0) > build.position),
  );
  const earlier = here.filter(({ position }) => position < build.position).sort((a, b) => b.position - a.position);
  const later = here.filter(({ position }) => position > build.position).sort((a, b) => a.position - b.position);
  return [...earlier, ...later].find((standing) => isSameLoss(context, standing, build, now));
}

/**
 * Compared with the latest build before it that shows the drop, and with the drop's own build, so that a loss creeping on by
 * less than the threshold a build is news once the threshold is reached. A build before all of them must lose about the same
 * as the first of them.
 */
function isSameLoss(context: Context, standing: StandingDrop, build: LostBuild, now: LostPlace): boolean {
  const losses = lossesOf(standing).filter(({ buildId }) => buildId !== build.id);
  const seen = (loss: SeenLoss): PlaceLoss => ({ ...loss, judgements: judgementsOf(context, loss.buildId, now) });
  const latest = losses.findLast(({ position }) => position < build.position);
  if (latest !== undefined) {
    const own = losses.find(({ buildId }) => buildId === standing.drop.buildId);
    const isOwnEarlier = own !== undefined && own.position < latest.position;
    const before = [latest, ...(isOwnEarlier ? [own] : [])].map(seen);
    return !before.some((then) => isFurtherLoss(now, then)) && !isOtherLoss(now, before[0]);
  }
  const next = seen(losses[0]);
  return !isNews(now, next) && !isNews(next, now);
}

function isNews(now: PlaceLoss, then: PlaceLoss): boolean {
  return isFurtherLoss(now, then) || isOtherLoss(now, then);
}

function judgementsOf(context: Context, buildId: number, place: Pick<LostPlace, 'stateId' | 'band'>): BandJudgement[] {
  return buildJudgements(context, buildId).filter(
    ({ stateId, band }) => stateId === place.stateId && band === place.band,
  );
}
