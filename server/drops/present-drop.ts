import type { DropSighting, DropSummary, DropView } from '@shared/contracts/drops';
import { isoTime } from '../iso-time';
import type { DropEvent, NamedDrop } from './drop-store';

export function presentDropSummary(named: NamedDrop): DropSummary {
  const { drop, product, productName, team, hardware, firmware, operatingState, ownerName } = named;
  const { id, buildId, band, state, differenceDb, marginDb, frequencyHz, isOverLimit, sentence } = drop;
  return {
    id,
    product,
    productName,
    team,
    buildId,
    hardware,
    firmware,
    operatingState,
    band,
    state,
    owner: drop.ownerId === null || ownerName === null ? null : { id: drop.ownerId, name: ownerName },
    differenceDb,
    marginDb,
    frequencyHz,
    isOverLimit,
    witnesses: drop.evidence.witnesses.map(({ line, detector }) => ({ line, detector })),
    sentence,
    latest: ownSighting(named),
    noLongerSeenIn: null,
    createdAt: isoTime(drop.createdAt),
    updatedAt: isoTime(drop.updatedAt),
  };
}

function ownSighting({ drop, hardware, firmware }: NamedDrop): DropSighting {
  const { buildId, differenceDb, marginDb, frequencyHz, isOverLimit } = drop;
  return { buildId, hardware, firmware, differenceDb, marginDb, frequencyHz, isOverLimit };
}

/** What a drop's page shows beyond its row. */
export interface DropDetails extends Pick<DropView, 'fixedBy' | 'moves' | 'assignable'> {
  readonly events: readonly DropEvent[];
}

export function presentDrop(named: NamedDrop, { events, ...details }: DropDetails): DropView {
  const { evidence } = named.drop;
  const remarks = evidence.witnesses.flatMap(({ judgement }) => judgement.remarks);
  return {
    ...presentDropSummary(named),
    ...details,
    evidence,
    seenIn: [ownSighting(named)],
    buildSwitching: named.buildSwitching,
    remarks: [...new Map(remarks.map(({ code, text }) => [text, { code, text }])).values()],
    history: events.map(({ at, actorName, kind, text }) => ({ at: isoTime(at), actor: actorName, kind, text })),
  };
}
