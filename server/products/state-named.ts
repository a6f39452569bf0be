import type { Context } from '../context';
import { ServiceError } from '../service-error';
import type { Product } from './product-store';
import { listStates, type OperatingState } from './state-store';

/** @throws ServiceError `invalid` when the product has no operating state with this name; the message names those it has */
export function stateNamed(context: Context, product: Product, name: string): OperatingState {
  const states = listStates(context.db, product.id);
  const state = states.find((one) => one.name === name);
  if (state === undefined) {
    throw new ServiceError('invalid', `state: "${name}" is none of ${states.map((one) => `"${one.name}"`).join(', ')}`);
  }
  return state;
}
