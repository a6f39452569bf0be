import { Router } from 'express';
import type { Context } from '../context';

/** The OpenAPI document and the page to read it. */
export function openapiRoutes(_context: Context): Router {
  return Router();
}
