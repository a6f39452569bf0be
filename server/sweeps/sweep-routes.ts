import { Router } from 'express';
import type { Context } from '../context';

/** Sweeps: import, record, trace, original, overlay. */
export function sweepRoutes(_context: Context): Router {
  return Router();
}
