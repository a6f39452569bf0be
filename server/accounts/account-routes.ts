import { Router } from 'express';
import type { Context } from '../context';
import { passwordRoutes } from './password-routes';
import { sessionRoutes } from './session-routes';

/** Sign-in, sign-out and passwords. */
export function accountRoutes(context: Context): Router {
  return Router().use(sessionRoutes(context), passwordRoutes(context));
}
