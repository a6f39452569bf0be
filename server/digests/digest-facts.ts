import type { ProductSummary } from '@shared/contracts/products';
import { OPEN_DROP_STATES } from '@shared/contracts/drops';
import type { Context } from '../context';
import { listOwnProducts } from '../products/list-own-products';
import { type DigestDrop, type DigestGain, listDigestDrops, listDigestGains } from './digest-facts-store';
import { type CreepOfBand, listCreep } from './list-creep';

/** Everything a digest says, before it is put into words. */
export interface DigestFacts {
  teamName: string;
  teamKey: string;
  timeZone: string;
  /** UTC milliseconds. */
  from: number;
  to: number;
  products: ProductSummary[];
  /** Raised in the period and still standing. */
  newDrops: DigestDrop[];
  /** Open from before. */
  olderDrops: DigestDrop[];
  /** Fixed or accepted in the period. */
  endedDrops: DigestDrop[];
  gains: DigestGain[];
  creep: (CreepOfBand & { product: string })[];
}

/** Collects what happened to a team's products between two moments, and how they stand now. */
export function digestFacts(
  context: Context,
  team: { id: number; key: string; name: string; timeZone: string },
  from: number,
  to: number,
): DigestFacts {
  const drops = listDigestDrops(context.db, team.id, from, to);
  const isOpen = (drop: DigestDrop) => OPEN_DROP_STATES.some((state) => state === drop.state);
  const isNew = (drop: DigestDrop) => drop.createdAt >= from && drop.createdAt < to;
  const own = listOwnProducts(context, team.id);
  return {
    teamName: team.name,
    teamKey: team.key,
    timeZone: team.timeZone,
    from,
    to,
    products: own.map(({ summary }) => summary),
    newDrops: drops.filter((drop) => isOpen(drop) && isNew(drop)),
    olderDrops: drops.filter((drop) => isOpen(drop) && !isNew(drop)),
    endedDrops: drops.filter((drop) => drop.state === 'fixed' || drop.state === 'accepted'),
    gains: listDigestGains(context.db, team.id, from, to),
    creep: own.flatMap(({ id, summary }) =>
      listCreep(context, id, summary.targetMarginDb).map((creep) => ({ ...creep, product: summary.name })),
    ),
  };
}
