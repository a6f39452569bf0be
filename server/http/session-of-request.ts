import type { Request, Response } from 'express';
import passport from 'passport';
import { issueCrossSiteToken } from './cross-site';
import type {} from './session-user';

passport.serializeUser<number>((user, done) => done(null, user.personId));
passport.deserializeUser<number>((personId, done) => done(null, { personId }));

/** Signs the browser in under a new session id, which an id planted before cannot be, and hands out the token for it. */
export function startSession(request: Request, response: Response, personId: number): Promise<void> {
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

/** Signs the browser out, under a new session id again. */
export function endSession(request: Request, response: Response): Promise<void> {
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
