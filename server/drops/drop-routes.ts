import { Router } from 'express';
import type { Context } from '../context';

/** Drops and their triage. */
export function dropRoutes(_context: Context): Router {
  return Router();
}
