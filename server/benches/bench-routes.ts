import { Router } from 'express';
import type { Context } from '../context';

/** Benches of a team. */
export function benchRoutes(_context: Context): Router {
  return Router();
}
