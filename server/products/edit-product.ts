import type { ProductInput, ProductPatch } from '@shared/contracts/products';
import { findLimitSet, LIMIT_SETS } from '@shared/limits/limit-sets';
import type * as z from 'zod';
import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { markStale } from '../judging/mark-stale';
import { ServiceError } from '../service-error';
import type { FoundProduct } from './find-product';
import { countSweeps, insertProduct, type Product, type Team, updateProduct } from './product-store';

/** @throws ServiceError `conflict` when the team has a product with this key; `invalid` for an unknown limit set */
export function createProduct(
  context: Context,
  actor: Actor,
  team: Team,
  input: z.infer<typeof ProductInput>,
): Product {
  requireLimitSet(input.limitSetKey);
  return withTransaction(context.db, () => {
    const product = insertProduct(context.db, { ...input, teamId: team.id, createdAt: context.now() });
    if (product === undefined) throw new ServiceError('conflict', `key: the team has a product "${input.key}" already`);
    recordAudit(context, actor, {
      teamId: team.id,
      action: 'product.created',
      subjectKind: 'product',
      subjectId: product.id,
      summary: `Product ${product.key} was created`,
      details: { now: input },
    });
    return product;
  });
}

/**
 * Changes a product's settings.
 *
 * @throws ServiceError `invalid` for an unknown limit set; `conflict` for another limit set once sweeps were judged by the
 *   present one, whose margins would no longer be comparable
 */
export function editProduct(
  context: Context,
  actor: Actor,
  { product }: FoundProduct,
  patch: z.infer<typeof ProductPatch>,
): Product {
  if (Object.keys(patch).length === 0) return product;
  const isOtherLimit = patch.limitSetKey !== undefined && patch.limitSetKey !== product.limitSetKey;
  if (patch.limitSetKey !== undefined) requireLimitSet(patch.limitSetKey);
  if (isOtherLimit && countSweeps(context.db, product.id) > 0) {
    throw new ServiceError(
      'conflict',
      `limitSetKey: ${product.key} has sweeps with margins to ${product.limitSetKey}; make a product of its own for ${patch.limitSetKey}`,
    );
  }
  return withTransaction(context.db, () => {
    const changed = updateProduct(context.db, product.id, patch);
    // Verdicts state the target margin they were held against.
    if (changed.targetMarginDb !== product.targetMarginDb) markStale(context, product.id, 1);
    recordAudit(context, actor, {
      teamId: product.teamId,
      action: 'product.changed',
      subjectKind: 'product',
      subjectId: product.id,
      summary: `Settings of ${product.key} were changed`,
      details: { before: pick(product, patch), now: patch },
    });
    return changed;
  });
}

function requireLimitSet(key: string): void {
  if (findLimitSet(key) !== undefined) return;
  throw new ServiceError('invalid', `limitSetKey: "${key}" is none of ${LIMIT_SETS.map((set) => set.key).join(', ')}`);
}

/** The values of `whole` under the names of `part`. */
function pick(whole: Product, part: object): Record<string, unknown> {
  return Object.fromEntries(Object.entries(whole).filter(([name]) => name in part));
}
