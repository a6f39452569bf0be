import { may } from '@shared/access/may';
import type { SweepQuery } from '@shared/contracts/sweeps';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { findProduct } from '../products/find-product';
import { ServiceError } from '../service-error';
import { findTeam } from '../teams/find-team';
import { listSweepRows, type SweepFilter, type SweepRow } from './sweep-view-store';

export interface SweepRows {
  rows: SweepRow[];
  /** Where the next page goes on; null at the end. */
  nextBefore: number | null;
}

/**
 * One page of the sweeps that the actor may read: of a product, or else of a team, or else of all teams of the actor.
 *
 * @throws ServiceError `notFound` or `forbidden` for product and team
 */
export function listSweeps(context: Context, actor: Actor, query: SweepQuery): SweepRows {
  const { team, product, build, limit, ...rest } = query;
  const filter: SweepFilter = { ...rest, buildId: build, ...scopeOf(context, actor, product, team) };
  const rows = listSweepRows(context.db, filter, limit + 1);
  const page = rows.slice(0, limit);
  return { rows: page, nextBefore: rows.length > limit ? (page.at(-1)?.sweep.id ?? null) : null };
}

function scopeOf(context: Context, actor: Actor, product?: string, team?: string): SweepFilter {
  if (product !== undefined) {
    return { productId: findProduct(context, actor, product, team, 'results.read').product.id };
  }
  if (team !== undefined) return { teamIds: [findTeam(context, actor, team, 'results.read').id] };
  const teamIds = teamsRead(actor);
  if (teamIds.length === 0) throw new ServiceError('forbidden', 'this needs a team whose results you may read');
  return { teamIds };
}

function teamsRead(actor: Actor): number[] {
  const own = actor.kind === 'person' ? [...actor.roles.keys()] : actor.kind === 'token' ? [actor.teamId] : [];
  return own.filter((teamId) => may(actor, 'results.read', teamId));
}
