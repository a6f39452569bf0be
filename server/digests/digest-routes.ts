import { Router } from 'express';
import type { Context } from '../context';

/** Digest settings, recipients, unsubscribe. */
export function digestRoutes(_context: Context): Router {
  return Router();
}
