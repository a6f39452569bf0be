import { Router } from 'express';
import type { Context } from '../context';

/** Team tokens. */
export function tokenRoutes(_context: Context): Router {
  return Router();
}
