import { Router } from 'express';
import type { Context } from '../context';

/** Read models: trend and margin map. */
export function marginRoutes(_context: Context): Router {
  return Router();
}
