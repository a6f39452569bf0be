import type { ProductSummary } from '@shared/contracts/products';
import type { Context } from '../context';
import { listOwnProducts } from '../products/list-own-products';
import { type DigestDrops, digestDrops } from './digest-drops';
import { type DigestGain, listDigestGains } from './digest-facts-store';
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
  drops: DigestDrops;
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
  const own = listOwnProducts(context, team.id);
  return {
    teamName: team.name,
    teamKey: team.key,
    timeZone: team.timeZone,
    from,
    to,
    products: own.map(({ summary }) => summary),
    drops: digestDrops(context, team.id, from, to),
    gains: listDigestGains(context.db, team.id, from, to),
    creep: own.flatMap(({ id, summary }) =>
      listCreep(context, id, summary.targetMarginDb).map((creep) => ({ ...creep, product: summary.name })),
    ),
  };
}
