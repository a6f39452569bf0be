import { Router } from 'express';
import type { Context } from '../context';

/** Teams and people of the installation, for administrators. */
export function installationRoutes(_context: Context): Router {
  return Router();
}
