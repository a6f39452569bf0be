import { OPEN_DROP_STATES, type DropSighting, type DropSummary } from '@shared/contracts/drops';
import type { NamedDrop } from './drop-store';
import type { PlacedSighting } from './sighting-store';

/** A drop from build to build. */
export interface TracedDrop extends NamedDrop {
  /** Builds that show the loss, oldest first. */
  readonly seenIn: readonly DropSighting[];
  /** The newest of them. */
  readonly latest: DropSighting;
  readonly noLongerSeenIn: DropSummary['noLongerSeenIn'];
}

/** @param sightings of this drop, oldest build first */
export function traceDrop(named: NamedDrop, sightings: readonly PlacedSighting[]): TracedDrop {
  const { drop, hardware, firmware, buildPosition } = named;
  const seen = sightings.flatMap(({ loss, ...build }) => (loss === null ? [] : [{ ...build, ...loss }]));
  const own = { ...drop, position: buildPosition, hardware, firmware };
  const byPosition = [own, ...seen].sort((a, b) => a.position - b.position);
  const last = byPosition[byPosition.length - 1];
  const back = sightings.find(({ loss, position }) => loss === null && position > last.position);
  return {
    ...named,
    seenIn: byPosition.map(presentSighting),
    latest: presentSighting(last),
    noLongerSeenIn: back ? { id: back.buildId, hardware: back.hardware, firmware: back.firmware } : null,
  };
}

function presentSighting({
  buildId,
  hardware,
  firmware,
  differenceDb,
  marginDb,
  frequencyHz,
  isOverLimit,
}: DropSighting): DropSighting {
  return { buildId, hardware, firmware, differenceDb, marginDb, frequencyHz, isOverLimit };
}

/** Open ones first, then by what is left now: over the limit, least margin, largest loss. */
export function compareTracedDrops(a: TracedDrop, b: TracedDrop): number {
  return (
    Number(isOpen(b)) - Number(isOpen(a)) ||
    Number(b.latest.isOverLimit) - Number(a.latest.isOverLimit) ||
    a.latest.marginDb - b.latest.marginDb ||
    a.latest.differenceDb - b.latest.differenceDb ||
    a.drop.id - b.drop.id
  );
}

function isOpen({ drop }: TracedDrop): boolean {
  return OPEN_DROP_STATES.some((state) => state === drop.state);
}
