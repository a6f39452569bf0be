import type { Context } from '../context';
import type { Product } from './product-store';
import { findOrInsertUnit, type Unit } from './state-store';

/** The unit with this serial number; a new one is made. */
export function findOrCreateUnit(context: Context, product: Product, serial: string): Unit {
  return findOrInsertUnit(context.db, product.id, serial, context.now());
}
