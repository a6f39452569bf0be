import { Router } from 'express';
import type { Context } from '../context';

/** The local mailbox of development and demo. */
export function mailboxRoutes(_context: Context): Router {
  return Router();
}
