import { Router } from 'express';
import type { Context } from '../context';

/** The audit log. */
export function auditRoutes(_context: Context): Router {
  return Router();
}
