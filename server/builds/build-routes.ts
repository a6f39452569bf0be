import { Router } from 'express';
import type { Context } from '../context';

/** Builds of a product. */
export function buildRoutes(_context: Context): Router {
  return Router();
}
