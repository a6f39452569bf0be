import type { Request, RequestHandler, Response } from 'express';
import session from 'express-session';
import passport from 'passport';
import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { isByToken, issueCrossSiteToken } from './cross-site';
import { SESSION_MS, SessionStore } from './session-store';
import type {} from './session-user';

passport.serializeUser<number>((user, done) => done(null, user.personId));
passport.deserializeUser<number>((personId, done) => done(null, { personId }));

/** Finds the session of the cookie and whose it is. */
export function readSession(context: Context): RequestHandler[] {
  const read = session({
    store: new SessionStore(context.db, context.now),
    name: 'strandline',
    secret: context.config.sessionSecret,
    resave: false,
    saveUninitialized: false,
    rolling: true,
    cookie: { httpOnly: true, sameSite: 'lax', secure: 'auto', maxAge: SESSION_MS },
  });
  return [read, passport.session() as RequestHandler];
}

/**
 * Signs the browser in under a new session id, which an id planted before cannot be, and hands out the token for it.
 *
 * @throws ServiceError `invalid` beside a team token, which has no session
 */
export function startSession(request: Request, response: Response, personId: number): Promise<void> {
  if (isByToken(request)) throw new ServiceError('invalid', 'a team token opens no session: leave it out to sign in');
  return new Promise((resolve, reject) => {
    request.logIn({ personId }, (error?: Error | null) => {
      if (error) {
        reject(error);
        return;
      }
      issueCrossSiteToken(request, response);
      resolve();
    });
  });
}

/** Signs the browser out, under a new session id again. A team token has no session to end. */
export function endSession(request: Request, response: Response): Promise<void> {
  if (isByToken(request)) return Promise.resolve();
  return new Promise((resolve, reject) => {
    request.logout((error?: Error | null) => {
      if (error) {
        reject(error);
        return;
      }
      issueCrossSiteToken(request, response);
      resolve();
    });
  });
}
