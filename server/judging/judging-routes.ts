import { Router } from 'express';
import type { Context } from '../context';

/** Verdicts, evaluation, gate and job runs. */
export function judgingRoutes(_context: Context): Router {
  return Router();
}
