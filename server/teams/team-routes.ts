import { Router } from 'express';
import type { Context } from '../context';

/** A team, its members and invitations. */
export function teamRoutes(_context: Context): Router {
  return Router();
}
