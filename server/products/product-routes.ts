import { Router } from 'express';
import type { Context } from '../context';

/** Products, their states, reference and shares. */
export function productRoutes(_context: Context): Router {
  return Router();
}
