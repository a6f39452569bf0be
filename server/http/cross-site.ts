import { csrfSync } from 'csrf-sync';
import type { Request, RequestHandler, Response } from 'express';
import { ServiceError } from '../service-error';
import { actorIfAny } from './actor-of';

const { csrfSynchronisedProtection, generateToken } = csrfSync({
  getTokenFromRequest: (request) => request.get('x-xsrf-token'),
  errorConfig: { statusCode: 403, message: 'the page is out of date: reload it and try again', code: 'forbidden' },
});

/** Puts a fresh token where the pages pick it up; needed after every change of the session. A team token needs none. */
export function issueCrossSiteToken(request: Request, response: Response): void {
  if (isByToken(request)) return;
  response.cookie('XSRF-TOKEN', generateToken(request, true), { sameSite: 'lax', secure: request.secure, path: '/' });
}

/** Refuses a change made with the session cookie but without its token. A team token is no cookie and needs none. */
export const guardCrossSite: RequestHandler = (request, response, next) => {
  if (isByToken(request)) {
    next();
    return;
  }
  csrfSynchronisedProtection(request, response, (error?: unknown) => {
    if (error === undefined) next();
    else next(new ServiceError('forbidden', 'the page is out of date: reload it and try again'));
  });
};

/** Whether a team token makes the request, which then has no session (identify.ts). */
export function isByToken(request: Request): boolean {
  return actorIfAny(request)?.kind === 'token';
}
