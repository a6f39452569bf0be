import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import type { Product } from './product-store';
import { findStateByName, insertState, type OperatingState } from './state-store';

/** The operating state with this name; a new one is made without supply and load, which the team fills in later. */
export function findOrCreateState(context: Context, actor: Actor, product: Product, name: string): OperatingState {
  const { db } = context;
  return withTransaction(db, () => {
    const found = findStateByName(db, product.id, name);
    if (found) return found;
    const state = insertState(db, { productId: product.id, name, createdAt: context.now() });
    recordAudit(context, actor, {
      teamId: product.teamId,
      action: 'state.created',
      subjectKind: 'operatingState',
      subjectId: state.id,
      summary: `Operating state "${name}" of ${product.key} appeared`,
    });
    return state;
  });
}
