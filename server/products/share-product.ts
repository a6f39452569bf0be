import type { PersonActor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import type { FoundProduct } from './find-product';
import { listShares, listTeamsByKey, replaceShares } from './product-store';

/**
 * Sets which other teams may read the product's results.
 *
 * @throws ServiceError `invalid` naming a team that does not exist
 */
export function shareProduct(
  context: Context,
  person: PersonActor,
  { product, team }: FoundProduct,
  keys: readonly string[],
): void {
  const wanted = [...new Set(keys)].filter((key) => key !== team.key);
  const teams = listTeamsByKey(context.db, wanted);
  const unknown = wanted.find((key) => !teams.some((one) => one.key === key));
  if (unknown !== undefined) throw new ServiceError('invalid', `teams: there is no team "${unknown}"`);
  const before = listShares(context.db, product.id).map(({ key }) => key);
  withTransaction(context.db, () => {
    replaceShares(
      context.db,
      product.id,
      teams.map(({ id }) => id),
      { personId: person.personId, at: context.now() },
    );
    recordAudit(context, person, {
      teamId: product.teamId,
      action: 'product.shared',
      subjectKind: 'product',
      subjectId: product.id,
      summary:
        wanted.length === 0
          ? `${product.key} is shared with no other team`
          : `${product.key} is shared with ${wanted.join(', ')}`,
      details: { before, now: wanted },
    });
  });
}
