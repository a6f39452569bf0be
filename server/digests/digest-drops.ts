import { OPEN_DROP_STATES } from '@shared/contracts/drops';
import { formatDecibels } from '@shared/units/format-decibels';
import type { Context } from '../context';
import { findDrops } from '../drops/find-drops';
import type { TracedDrop } from '../drops/trace-drop';

export interface DigestDrop {
  id: number;
  product: string;
  sentence: string;
  state: TracedDrop['drop']['state'];
  owner: string | null;
  /** Where a later build shows it too: which, and what is left there. */
  now: string | null;
}

export interface DigestDrops {
  /** Raised in the period and still open. */
  newOnes: DigestDrop[];
  /** Open from before. */
  older: DigestDrop[];
  /** Fixed or accepted in the period. */
  ended: DigestDrop[];
}

/** The drops of a team that a digest of the time between two moments speaks of, most urgent first. */
export function digestDrops(context: Context, teamId: number, from: number, to: number): DigestDrops {
  const drops = findDrops(context, { kind: 'job', name: 'digest' }, { teamId }, {});
  const isIn = (at: number) => at >= from && at < to;
  const open = drops.filter(({ drop }) => OPEN_DROP_STATES.some((state) => state === drop.state));
  const ended = drops.filter(({ drop }) => ['fixed', 'accepted'].includes(drop.state) && isIn(drop.updatedAt));
  return {
    newOnes: open.filter(({ drop }) => isIn(drop.createdAt)).map(present),
    older: open.filter(({ drop }) => !isIn(drop.createdAt)).map(present),
    ended: ended.map(present),
  };
}

function present({ drop, productName, ownerName, latest }: TracedDrop): DigestDrop {
  const left = latest.isOverLimit
    ? `${formatDecibels(-latest.marginDb)} over the limit`
    : `${formatDecibels(latest.marginDb)} left`;
  return {
    id: drop.id,
    product: productName,
    sentence: drop.sentence,
    state: drop.state,
    owner: ownerName,
    now: latest.buildId === drop.buildId ? null : `still there in ${latest.hardware} / ${latest.firmware}, ${left}`,
  };
}
