import type { Context } from '../context';
import { listNamedBuilds, type NamedBuild, openDropsByBuild } from './build-store';

export interface ListedBuild extends NamedBuild {
  openDrops: number;
}

/** Builds of a product with the number of their open drops, oldest first. */
export function listBuilds(context: Context, productId: number): ListedBuild[] {
  const openDrops = openDropsByBuild(context.db, productId);
  return listNamedBuilds(context.db, productId).map((named) => ({
    ...named,
    openDrops: openDrops.get(named.build.id) ?? 0,
  }));
}
