import { Router } from 'express';
import type { Context } from '../context';
import { sessionRoutes } from './session-routes';

/** Sign-in, sign-out, invitation, password. */
export function accountRoutes(context: Context): Router {
  return Router().use(sessionRoutes(context));
}
