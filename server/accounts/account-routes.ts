import { Router } from 'express';
import type { Context } from '../context';

/** Sign-in, sign-out, invitation, password. */
export function accountRoutes(_context: Context): Router {
  return Router();
}
