import { Router } from 'express';
import type { Context } from '../context';

/** Limit sets. */
export function limitRoutes(_context: Context): Router {
  return Router();
}
