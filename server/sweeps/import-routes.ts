import { Router } from 'express';
import type { Context } from '../context';

/** Import by page: readings and batches. */
export function importRoutes(_context: Context): Router {
  return Router();
}
