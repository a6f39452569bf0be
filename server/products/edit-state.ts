import type { StateInput } from '@shared/contracts/products';
import type * as z from 'zod';
import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import type { Product } from './product-store';
import { findStateByName, insertState, listStates, type OperatingState, updateState } from './state-store';

type Values = z.infer<typeof StateInput>;

/** @throws ServiceError `conflict` when the product has an operating state with this name */
export function createState(context: Context, actor: Actor, product: Product, values: Values): OperatingState {
  return withTransaction(context.db, () => {
    requireFreeName(context, product, values.name);
    const state = insertState(context.db, { ...values, productId: product.id, createdAt: context.now() });
    audit(context, actor, product, state, 'created', { now: values });
    return state;
  });
}

/** @throws ServiceError `notFound`; `conflict` when another operating state has the new name */
export function editState(
  context: Context,
  actor: Actor,
  product: Product,
  stateId: number,
  values: Partial<Values>,
): OperatingState {
  return withTransaction(context.db, () => {
    const before = listStates(context.db, product.id).find((state) => state.id === stateId);
    if (before === undefined)
      throw new ServiceError('notFound', `the product has no operating state number ${stateId}`);
    if (Object.keys(values).length === 0) return before;
    if (values.name !== undefined && values.name !== before.name) requireFreeName(context, product, values.name);
    const state = updateState(context.db, stateId, values);
    audit(context, actor, product, state, 'changed', { before, now: values });
    return state;
  });
}

function requireFreeName(context: Context, product: Product, name: string): void {
  if (findStateByName(context.db, product.id, name) === undefined) return;
  throw new ServiceError('conflict', `name: ${product.key} has an operating state "${name}" already`);
}

function audit(
  context: Context,
  actor: Actor,
  product: Product,
  state: OperatingState,
  verb: 'created' | 'changed',
  details: Record<string, unknown>,
): void {
  recordAudit(context, actor, {
    teamId: product.teamId,
    action: `state.${verb}`,
    subjectKind: 'operatingState',
    subjectId: state.id,
    summary: `Operating state "${state.name}" of ${product.key} was ${verb}`,
    details,
  });
}
