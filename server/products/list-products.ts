import { may } from '@shared/access/may';
import type { ProductSummary } from '@shared/contracts/products';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { findTeam } from '../teams/find-team';
import { listReachableProducts } from './product-store';
import { summariseProduct } from './summarise-product';

/**
 * Products whose results the actor may read, by name: those of one team and those shared with it, or without a team
 * those of all the actor's teams.
 *
 * @throws ServiceError `notFound` for a team that is not the actor's
 */
export function listProducts(context: Context, actor: Actor, teamKey: string | undefined): ProductSummary[] {
  const teamIds = teamKey === undefined ? readableTeams(actor) : [findTeam(context, actor, teamKey, 'results.read').id];
  return listReachableProducts(context.db, teamIds).map((found) =>
    summariseProduct(context, found, !teamIds.includes(found.team.id)),
  );
}

function readableTeams(actor: Actor): number[] {
  const teamIds = actor.kind === 'person' ? [...actor.roles.keys()] : actor.kind === 'token' ? [actor.teamId] : [];
  return teamIds.filter((teamId) => may(actor, 'results.read', teamId));
}
