import type { DropSummary, DropView } from '@shared/contracts/drops';
import { isoTime } from '../iso-time';
import type { DropEvent } from './drop-store';
import type { TracedDrop } from './trace-drop';

export function presentDropSummary(traced: TracedDrop): DropSummary {
  const { drop, product, productName, team, hardware, firmware, operatingState, ownerName } = traced;
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
    latest: traced.latest,
    seenIn: [...traced.seenIn],
    noLongerSeenIn: traced.noLongerSeenIn,
    createdAt: isoTime(drop.createdAt),
    updatedAt: isoTime(drop.updatedAt),
  };
}

/** What a drop's page shows beyond its row. */
export interface DropDetails extends Pick<DropView, 'fixedBy' | 'moves' | 'assignable'> {
  readonly events: readonly DropEvent[];
}

export function presentDrop(traced: TracedDrop, { events, ...details }: DropDetails): DropView {
  const { evidence } = traced.drop;
  const remarks = evidence.witnesses.flatMap(({ judgement }) => judgement.remarks);
  return {
    ...presentDropSummary(traced),
    ...details,
    evidence,
    buildSwitching: traced.buildSwitching,
    remarks: [...new Map(remarks.map(({ code, text }) => [text, { code, text }])).values()],
    history: events.map(({ at, actorName, kind, text }) => ({ at: isoTime(at), actor: actorName, kind, text })),
  };
}
